import { writeSync } from 'node:fs';

/** Writes all of a text to standard output (1) or standard error (2), also into a slow pipe, before the program ends. */
export function write(to: 1 | 2, text: string): void {
	const bytes = Buffer.from(text, 'utf8');
	let sent = 0;
	while (sent < bytes.length) {
		try {
			sent += writeSync(to, bytes, sent);
		} catch (error) {
			const code = error instanceof Error && 'code' in error ? error.code : null;
			if (code === 'EPIPE') return; // the reader has seen enough
			if (code !== 'EAGAIN') throw error;
		}
	}
}
