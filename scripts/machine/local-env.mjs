/** Secrets and ports of this machine, made once and kept in .evendraft/local.env, which only its owner may read. */
import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { KEPT } from './folders.mjs';

export const secret = () => randomBytes(32).toString('base64url');

/** @param {string} text @returns {Record<string, string>} */
export function readPairs(text) {
	/** @type {Record<string, string>} */
	const pairs = {};
	for (const line of text.split('\n')) {
		const at = line.indexOf('=');
		if (at > 0 && !line.startsWith('#')) pairs[line.slice(0, at).trim()] = line.slice(at + 1).trim();
	}
	return pairs;
}

/**
 * The kept values, with those that are missing made and those that changed written.
 * @param {Record<string, string>} [changes]
 * @param {string} [folder]
 */
export function localEnv(changes = {}, folder = KEPT) {
	const file = join(folder, 'local.env');
	const kept = existsSync(file) ? readPairs(readFileSync(file, 'utf8')) : {};
	const values = {
		AUTH_SECRET: secret(),
		DATABASE_OWNER_PASSWORD: secret(),
		DATABASE_APP_PASSWORD: secret(),
		...kept,
		...changes
	};
	const text = Object.entries(values)
		.map(([name, value]) => `${name}=${value}\n`)
		.join('');
	if (JSON.stringify(values) !== JSON.stringify(kept)) {
		const half = `${file}.${process.pid}`;
		writeFileSync(half, `# Made by npm start for this machine alone.\n${text}`, { mode: 0o600 });
		renameSync(half, file);
	}
	return values;
}
