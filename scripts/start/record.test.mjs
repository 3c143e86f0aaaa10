import { spawn } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { isAlive, markOf } from '../machine/processes.mjs';
import { stopLeftServer, takeRecord } from './record.mjs';

let folder = '';
beforeEach(() => {
	folder = mkdtempSync(join(tmpdir(), 'evendraft-record-'));
});
afterEach(() => rmSync(folder, { recursive: true }));
const file = () => join(folder, 'running.json');

describe('the record of a running start', () => {
	it('is taken, added to and dropped', () => {
		const record = takeRecord(file());
		expect(record.left).toBeNull();
		record.note({ address: 'http://localhost:5180' });
		expect(JSON.parse(readFileSync(file(), 'utf8'))).toEqual({
			start: markOf(process.pid),
			address: 'http://localhost:5180'
		});
		record.drop();
		expect(existsSync(file())).toBe(false);
	});

	it('refuses a second start and says where the first one is', () => {
		takeRecord(file()).note({ address: 'http://localhost:5180' });
		expect(() => takeRecord(file())).toThrow(/already runs here at http:\/\/localhost:5180 \(process \d+\)/);
	});

	it('of a start that was killed is taken over, also when its number was given to another', () => {
		const dead = { start: { pid: process.pid, began: 'earlier' }, address: 'http://localhost:5180' };
		writeFileSync(file(), JSON.stringify(dead));
		expect(takeRecord(file()).left).toEqual(dead);
	});

	it.each(['', '{', 'null', '[]', '{"start":3}'])('that reads %j counts for nothing', (text) => {
		writeFileSync(file(), text);
		expect(takeRecord(file()).left).toBeNull();
	});
});

describe('the server of a start that was killed', () => {
	it('is stopped if it is that very process', async () => {
		const pid = await new Promise((resolve) => {
			const child = spawn('sleep', ['60'], { detached: true });
			child.once('spawn', () => resolve(child.pid));
		});
		const server = markOf(pid);
		expect(await stopLeftServer({ start: server, server: { ...server, began: 'earlier' } })).toBe(false);
		expect(isAlive(server)).toBe(true);
		expect(await stopLeftServer({ start: server, server })).toBe(true);
		expect(isAlive(server)).toBe(false);
		expect(await stopLeftServer(null)).toBe(false);
	});
});
