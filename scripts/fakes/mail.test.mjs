import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { request } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import nodemailer from 'nodemailer';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { startMailFake } from './mail.mjs';
import { openInbox } from './inbox.mjs';

let folder = '';
/** @type {Awaited<ReturnType<typeof startMailFake>>} */
let fake;
beforeEach(async () => {
	folder = mkdtempSync(join(tmpdir(), 'evendraft-mail-'));
	fake = await startMailFake({ folder });
});
afterEach(async () => {
	await fake.close();
	rmSync(folder, { recursive: true });
});

/** @param {object} more */
const send = (more) =>
	nodemailer.createTransport(fake.smtpUrl).sendMail({ from: 'Evendraft <app@demo.test>', to: 'a@demo.test', ...more });
/** @param {string} path @param {RequestInit} [init] */
const inbox = async (path, init) => (await fetch(fake.inboxUrl + path, init)).json();

describe('the mail fake', () => {
	it('has a message as soon as it was sent', async () => {
		await send({ subject: 'Résumé √2', text: 'Go to http://localhost/x?token=a=b', html: '<p>Go</p>' });
		const [message] = await inbox('/messages');
		expect(message).toMatchObject({
			from: 'app@demo.test',
			to: ['a@demo.test'],
			subject: 'Résumé √2',
			html: '<p>Go</p>'
		});
		expect(message.text).toContain('http://localhost/x?token=a=b');
		expect(await inbox(`/messages/${message.id}`)).toMatchObject({ subject: 'Résumé √2' });
		expect(await inbox('/health')).toEqual({ ok: true, messages: 1 });
	});

	it('lists the newest first, and those of one address, capitals or not, hidden copies too', async () => {
		await send({ subject: 'one' });
		await send({ subject: 'two', to: 'b@demo.test', bcc: 'A@Demo.test' });
		await send({ subject: 'three', to: 'b@demo.test' });
		const subjects = async (/** @type {string} */ query) =>
			(await inbox(`/messages${query}`)).map((/** @type {{ subject: string }} */ { subject }) => subject);
		expect(await subjects('')).toEqual(['three', 'two', 'one']);
		expect(await subjects('?to=a@demo.test')).toEqual(['two', 'one']);
	});

	it('keeps attachments for the single message', async () => {
		await send({ attachments: [{ filename: 'a.pdf', content: Buffer.from('%PDF-') }] });
		const [listed] = await inbox('/messages');
		expect(listed.attachments).toEqual([{ name: 'a.pdf', type: 'application/pdf', size: 5 }]);
		const { attachments } = await inbox(`/messages/${listed.id}`);
		expect(Buffer.from(attachments[0].base64, 'base64').toString()).toBe('%PDF-');
	});

	it('keeps its messages over a restart, and passes over a broken file', async () => {
		await send({ subject: 'kept' });
		await fake.close();
		writeFileSync(join(folder, '0-broken.json'), '{');
		fake = await startMailFake({ folder });
		expect(await inbox('/messages')).toMatchObject([{ subject: 'kept' }]);
	});

	it('is emptied on request', async () => {
		await send({});
		await inbox('/messages', { method: 'DELETE' });
		expect(await inbox('/messages')).toEqual([]);
		expect(readdirSync(folder)).toEqual([]);
	});

	it('refuses a message beyond 16 MB', { timeout: 30_000 }, async () => {
		await expect(
			send({ attachments: [{ filename: 'big', content: Buffer.alloc(13 * 1024 * 1024) }] })
		).rejects.toMatchObject({ responseCode: 552 });
		expect(await inbox('/messages')).toEqual([]);
	});

	it('refuses a page elsewhere that gave loopback a name of its own', async () => {
		const { hostname, port } = new URL(fake.inboxUrl);
		const status = await new Promise((resolve) =>
			request({ hostname, port, path: '/messages', headers: { host: 'evil.example' } }, ({ statusCode }) =>
				resolve(statusCode)
			).end()
		);
		expect(status).toBe(403);
	});

	it.each(['/', '/messages/none', '/messages/..%2Fx'])('has nothing at %s', async (path) => {
		expect((await fetch(fake.inboxUrl + path)).status).toBe(404);
	});
});

describe('the inbox', () => {
	it('holds the last 500 and removes the files of the others', () => {
		const place = join(folder, 'many');
		const box = openInbox(place);
		const mail = { from: 'a', to: ['b'], text: '', html: null, headers: [], attachments: [] };
		for (let n = 1; n <= 503; n++) box.add({ ...mail, subject: String(n) });
		expect(box.count()).toBe(500);
		expect(box.list(null)[0].subject).toBe('503');
		expect(box.list(null).at(-1)?.subject).toBe('4');
		expect(readdirSync(place)).toHaveLength(500);
		expect(openInbox(place).list(null)[0].subject).toBe('503');
	});
});
