/** `npm run bench`: how long the calculation takes, as JSON on standard output. */
import { pathToFileURL } from 'node:url';
import { bundle } from './bundle.mjs';

const { bench } = await import(pathToFileURL(await bundle('bench')).href);
process.stdout.write(`${JSON.stringify(bench(), null, 2)}\n`);
