/** Free TCP ports on loopback. */
import { createServer } from 'node:net';
import { Refusal } from './say.mjs';

/**
 * @param {number} port
 * @param {string} host
 * @returns {Promise<string | null>} null when the port can be had, else the system's code
 */
function bindProblem(port, host) {
	return new Promise((resolve) => {
		const server = createServer();
		server.once('error', (error) => resolve(/** @type {NodeJS.ErrnoException} */ (error).code ?? 'unknown'));
		server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(null)));
	});
}

/**
 * Why a port cannot be had on loopback. A browser may take localhost for either address, so a stranger on ::1 counts
 * too; a machine without IPv6 does not.
 * @param {number} port
 * @returns {Promise<string | null>} null when it is free, else EADDRINUSE, EACCES …
 */
export async function portProblem(port) {
	const problem = (await bindProblem(port, '127.0.0.1')) ?? (await bindProblem(port, '::1'));
	return problem === 'EADDRNOTAVAIL' || problem === 'EAFNOSUPPORT' ? null : problem;
}

/**
 * The first free port from `first` on, going round at `last`.
 * @param {number} first @param {number} last @param {number} [begin] where to look first
 */
export async function freePort(first, last, begin = first) {
	const count = last - first + 1;
	for (let n = 0; n < count; n++) {
		const port = first + ((begin - first + n) % count);
		if ((await portProblem(port)) === null) return port;
	}
	throw new Refusal(`No port from ${first} to ${last} is free: stop what listens there and run the command again.`);
}

const WEB_FIRST = 5180;
const WEB_LAST = 5279;

/**
 * The port of the web server: the one that the reader asked for, or the first free one from 5180.
 * @param {string | undefined} asked the variable PORT
 */
export async function webPort(asked) {
	if (asked === undefined || asked === '') return freePort(WEB_FIRST, WEB_LAST);
	const port = Number(asked);
	if (!/^\d+$/.test(asked) || port < 1 || port > 65535)
		throw new Refusal(`PORT is '${asked}', which is no port: set a whole number from 1 to 65535, or leave it out.`);
	const problem = await portProblem(port);
	if (problem === null) return port;
	if (problem === 'EACCES')
		throw new Refusal(`Port ${port} is reserved for the administrator: set PORT to 1024 or above, or leave it out.`);
	throw new Refusal(`Port ${port} is taken by another program: stop it, set PORT to another one, or leave it out.`);
}
