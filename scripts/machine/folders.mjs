/** Where the commands keep what they make: one folder that git ignores. */
import { chmodSync, mkdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

export const PROJECT = dirname(dirname(dirname(fileURLToPath(import.meta.url))));
export const KEPT = join(PROJECT, '.evendraft');
export const LOGS = join(KEPT, 'log');

/** Makes the folders. Others may pass through (the database's user has its folder inside) but not look around. */
export function makeFolders() {
	mkdirSync(LOGS, { recursive: true });
	chmodSync(KEPT, 0o711);
}
