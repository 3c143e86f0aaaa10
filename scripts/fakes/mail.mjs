/**
 * The mail server for local use and for tests: takes every message by SMTP, sends none, and lets the inbox be read by HTTP.
 * Both listen on loopback only. With a folder the messages outlive a restart.
 *
 *   GET /messages[?to=ADDRESS]   newest first, attachments without their content
 *   GET /messages/ID             one message, whole
 *   DELETE /messages             empties the inbox
 *   GET /health                  { ok, messages }
 */
import { once } from 'node:events';
import { createServer } from 'node:http';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import { openInbox } from './inbox.mjs';

const LOOPBACK = '127.0.0.1';
const SIZE_LIMIT = 16 * 1024 * 1024;

/** @param {string | undefined} address */
const isLoopback = (address) => address === LOOPBACK || address === `::ffff:${LOOPBACK}`;

/**
 * Starts the fake.
 * @param {{ smtpPort?: number, httpPort?: number, folder?: string }} [options] ports: any free one if left out
 * @returns {Promise<{ smtpUrl: string, inboxUrl: string, close: () => Promise<void> }>}
 */
export async function startMailFake({ smtpPort = 0, httpPort = 0, folder } = {}) {
	const inbox = openInbox(folder);
	const smtp = smtpServer(inbox);
	const http = createServer((request, response) => answer(inbox, request, response));
	smtp.listen(smtpPort, LOOPBACK);
	await once(smtp.server, 'listening');
	http.listen(httpPort, LOOPBACK);
	try {
		await once(http, 'listening');
	} catch (error) {
		smtp.close();
		throw error;
	}
	return {
		smtpUrl: `smtp://${LOOPBACK}:${portOf(smtp.server)}`,
		inboxUrl: `http://${LOOPBACK}:${portOf(http)}`,
		async close() {
			http.closeAllConnections();
			await Promise.all([
				new Promise((resolve) => smtp.close(() => resolve(undefined))),
				new Promise((resolve) => http.close(() => resolve(undefined)))
			]);
		}
	};
}

/** @param {import('node:net').Server} server */
function portOf(server) {
	const address = server.address();
	return address !== null && typeof address === 'object' ? address.port : 0;
}

/** @param {import('./inbox.mjs').Inbox} inbox */
function smtpServer(inbox) {
	return new SMTPServer({
		authOptional: true,
		disabledCommands: ['AUTH', 'STARTTLS'],
		disableReverseLookup: true,
		size: SIZE_LIMIT,
		closeTimeout: 500,
		onConnect(session, callback) {
			callback(isLoopback(session.remoteAddress) ? null : new Error('This machine only'));
		},
		async onData(stream, session, callback) {
			try {
				const mail = await simpleParser(await wholeMessage(stream));
				inbox.add({
					from: session.envelope.mailFrom ? session.envelope.mailFrom.address : '',
					to: session.envelope.rcptTo.map(({ address }) => address),
					subject: mail.subject ?? '',
					text: mail.text ?? '',
					html: mail.html || null,
					headers: mail.headerLines.map(({ line }) => line),
					attachments: mail.attachments.map(({ filename, contentType, size, content }) => ({
						name: filename ?? null,
						type: contentType,
						size,
						base64: content.toString('base64')
					}))
				});
				callback();
			} catch (error) {
				callback(/** @type {Error} */ (error));
			}
		}
	});
}

/** @param {import('smtp-server').SMTPServerDataStream} stream @returns {Promise<Buffer>} read to its end, kept to its limit */
async function wholeMessage(stream) {
	/** @type {Buffer[]} */
	const chunks = [];
	let size = 0;
	for await (const chunk of stream) {
		size += chunk.length;
		if (size <= SIZE_LIMIT) chunks.push(chunk);
	}
	if (size > SIZE_LIMIT) throw Object.assign(new Error('Message too large'), { responseCode: 552 });
	return Buffer.concat(chunks);
}

/**
 * @param {import('./inbox.mjs').Inbox} inbox
 * @param {import('node:http').IncomingMessage} request
 * @param {import('node:http').ServerResponse} response
 */
function answer(inbox, request, response) {
	const reply = (/** @type {number} */ status, /** @type {unknown} */ body) => {
		response.writeHead(status, { 'content-type': 'application/json; charset=utf-8', 'cache-control': 'no-store' });
		response.end(JSON.stringify(body));
	};
	// A web page elsewhere can point a name of its own at loopback; the messages hold sign-in links.
	const host = (request.headers.host ?? '').replace(/:\d+$/, '');
	if (!isLoopback(request.socket.remoteAddress) || !(host === LOOPBACK || host === 'localhost'))
		return reply(403, { error: 'This machine only' });
	const url = new URL(request.url ?? '/', `http://${LOOPBACK}`);
	const id = url.pathname.match(/^\/messages\/([\w-]+)$/)?.[1];
	if (request.method === 'GET' && url.pathname === '/health') return reply(200, { ok: true, messages: inbox.count() });
	if (request.method === 'GET' && url.pathname === '/messages')
		return reply(200, inbox.list(url.searchParams.get('to')));
	if (request.method === 'DELETE' && url.pathname === '/messages') {
		inbox.clear();
		return reply(200, { ok: true });
	}
	const message = request.method === 'GET' && id ? inbox.find(id) : null;
	return message ? reply(200, message) : reply(404, { error: 'Nothing here' });
}
