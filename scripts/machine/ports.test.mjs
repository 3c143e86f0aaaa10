import { createServer } from 'node:net';
import { afterEach, describe, expect, it } from 'vitest';
import { freePort, portProblem, webPort } from './ports.mjs';

/** @type {import('node:net').Server[]} */
const servers = [];
afterEach(async () => {
	await Promise.all(servers.splice(0).map((server) => new Promise((resolve) => server.close(resolve))));
});

/** @param {string} host @param {number} [port] @returns {Promise<number>} */
function occupy(host, port = 0) {
	return new Promise((resolve, reject) => {
		const server = createServer();
		servers.push(server);
		server.once('error', reject);
		server.listen(port, host, () => resolve(/** @type {import('node:net').AddressInfo} */ (server.address()).port));
	});
}

describe('a port', () => {
	it('is free when nobody listens, and taken when somebody does', async () => {
		const port = await occupy('127.0.0.1');
		expect(await portProblem(port)).toBe('EADDRINUSE');
		await new Promise((resolve) => servers.splice(0)[0].close(resolve));
		expect(await portProblem(port)).toBeNull();
	});

	it('is taken by one who listens everywhere', async () => {
		expect(await portProblem(await occupy('0.0.0.0'))).toBe('EADDRINUSE');
	});

	it('is passed over when taken, and the search goes round', async () => {
		const port = await occupy('127.0.0.1');
		expect(await freePort(port, port + 20)).toBeGreaterThan(port);
		const below = await freePort(port - 20, port, port);
		expect(below).toBeGreaterThanOrEqual(port - 20);
		expect(below).toBeLessThan(port);
	});

	it('that cannot be found is told in one line', async () => {
		const port = await occupy('127.0.0.1');
		await expect(freePort(port, port)).rejects.toThrow(`No port from ${port} to ${port} is free`);
	});
});

describe('the port of the web server', () => {
	it('is the one asked for', async () => {
		const port = await freePort(56_000, 56_999);
		expect(await webPort(String(port))).toBe(port);
	});

	it('is refused when asked for and taken', async () => {
		const port = await occupy('127.0.0.1');
		await expect(webPort(String(port))).rejects.toThrow(`Port ${port} is taken by another program`);
	});

	it.each(['abc', '0', '65536', '-1', '80.5', '1e3', ' 80'])('is refused when %j is no port', async (asked) => {
		await expect(webPort(asked)).rejects.toThrow('is no port');
	});
});
