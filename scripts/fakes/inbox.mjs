/** The messages of the mail fake: the last 500, newest first, in memory and, with a folder, one JSON file for each. */
import { randomBytes } from 'node:crypto';
import { mkdirSync, readdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

const LIMIT = 500;

/**
 * @typedef {{ name: string | null, type: string, size: number, base64: string }} Attachment
 * @typedef {{ from: string, to: string[], subject: string, text: string, html: string | null, headers: string[],
 *   attachments: Attachment[] }} Mail
 * @typedef {Mail & { id: string, received: string }} Message
 * @typedef {ReturnType<typeof openInbox>} Inbox
 */

/** @param {string} folder @returns {Message[]} oldest first; a file that cannot be read is passed over */
function readMessages(folder) {
	mkdirSync(folder, { recursive: true, mode: 0o700 });
	const names = readdirSync(folder).filter((name) => name.endsWith('.json'));
	return names.sort().flatMap((name) => {
		try {
			return [JSON.parse(readFileSync(join(folder, name), 'utf8'))];
		} catch {
			return [];
		}
	});
}

/** @param {string} [folder] */
export function openInbox(folder) {
	/** @type {Message[]} */
	const messages = folder ? readMessages(folder) : [];
	let last = 0;
	const fileOf = (/** @type {Message} */ { id }) => join(folder ?? '', `${id}.json`);

	/** Names sort by time, also within one millisecond. */
	const nextId = () => {
		last = Math.max(Date.now(), last + 1);
		return `${last}-${randomBytes(4).toString('hex')}`;
	};

	const drop = (/** @type {Message[]} */ old) => {
		if (folder) for (const message of old) rmSync(fileOf(message), { force: true });
	};

	return {
		/** @param {Mail} mail @returns {Message} */
		add(mail) {
			const message = { id: nextId(), received: new Date().toISOString(), ...mail };
			messages.push(message);
			drop(messages.splice(0, messages.length - LIMIT));
			if (folder) {
				const half = `${fileOf(message)}.half`;
				writeFileSync(half, JSON.stringify(message), { mode: 0o600 });
				renameSync(half, fileOf(message));
			}
			return message;
		},
		/** @param {string | null} [to] only what was sent to this address */
		list(to) {
			const address = to?.toLowerCase();
			return messages
				.filter((message) => !address || message.to.some((one) => one.toLowerCase() === address))
				.map((message) => ({
					...message,
					attachments: message.attachments.map(({ name, type, size }) => ({ name, type, size }))
				}))
				.reverse();
		},
		/** @param {string} id @returns {Message | null} */
		find: (id) => messages.find((message) => message.id === id) ?? null,
		count: () => messages.length,
		clear: () => drop(messages.splice(0))
	};
}
