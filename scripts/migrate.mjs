/**
 * Applies the migrations and makes the application's role, for a deployment: `npm run db:migrate` with
 * DATABASE_ADMIN_URL and DATABASE_APP_PASSWORD set.
 */
import { spawnSync } from 'node:child_process';
import { bundle } from './bundle.mjs';

const { status } = spawnSync(process.execPath, [await bundle('migrate')], { stdio: 'inherit' });
process.exitCode = status ?? 1;
