import { describe, expect, it } from 'vitest';
import { Turns, type GiveBack } from './turns';

/** Asks for turns, and tells who got one, in order. */
function asking(turns: Turns) {
	const got: string[] = [];
	const open = new Map<string, GiveBack>();
	const ask = (firm: string, name: string) =>
		turns.take(firm)?.then((giveBack) => {
			got.push(name);
			open.set(name, giveBack);
		}) ?? 'refused';
	const done = async (name: string) => {
		open.get(name)?.();
		await Promise.resolve();
	};
	return { got, ask, done };
}

describe('turns', () => {
	it('go to firms one after another, one at a time each', async () => {
		const { got, ask, done } = asking(new Turns(2, 10));
		for (const name of ['a1', 'a2', 'a3']) void ask('a', name);
		await Promise.resolve();
		expect(got).toEqual(['a1']);
		for (const name of ['b1', 'b2', 'c1']) void ask(name[0] ?? '', name);
		await Promise.resolve();
		expect(got).toEqual(['a1', 'b1']);
		await done('a1');
		// Another firm had waited; the first goes behind it.
		expect(got.slice(2)).toHaveLength(1);
		await done('b1');
		await done(got[2] ?? '');
		await done(got[3] ?? '');
		await done(got[4] ?? '');
		expect([...got].sort()).toEqual(['a1', 'a2', 'a3', 'b1', 'b2', 'c1']);
		expect(got.indexOf('c1')).toBeLessThan(got.indexOf('a3'));
	});

	it('are refused where a firm waits for too many', async () => {
		const { got, ask } = asking(new Turns(1, 2));
		for (const name of ['a1', 'a2', 'a3']) expect(ask('a', name)).not.toBe('refused');
		expect(ask('a', 'a4')).toBe('refused');
		expect(ask('b', 'b1')).not.toBe('refused');
		await Promise.resolve();
		expect(got).toEqual(['a1']);
	});
});
