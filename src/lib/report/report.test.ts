import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatPressure, type DesignDocument, type DesignRow } from '$lib/engine';
import { reportOf, type Account } from './report';
import { inputOf, library, treeOf } from './sample-input';

const CLOSE = 1e-9; // Pa: rounding of a sum of a few hundred doubles of some hundred pascals stays far below

/** Random trees on both sides of the fan, rooms under pressure, a warm riser. */
const designs = fc
	.array(
		fc.record({
			joins: fc.nat(),
			side: fc.constantFrom('supply', 'exhaust'),
			diameter: fc.double({ min: 0.1, max: 0.6, noNaN: true }),
			length: fc.double({ min: 0, max: 40, noNaN: true }),
			rise: fc.double({ min: -5, max: 5, noNaN: true }),
			flow: fc.double({ min: 0.02, max: 0.4, noNaN: true }),
			pressure: fc.constantFrom(0, 0, 12, -8)
		}),
		{ minLength: 1, maxLength: 25 }
	)
	.map((parts): DesignDocument => {
		const rows: (DesignRow & { open: boolean })[] = [];
		for (const { joins, side, diameter, length, rise } of parts) {
			const same = rows.filter((row) => row.side === side);
			const parent = same.length === 0 ? undefined : same[joins % (same.length + 1)];
			if (parent) parent.open = false;
			rows.push({
				tag: `${side}-${rows.length}`,
				joins: parent?.tag ?? null,
				side: side as 'supply' | 'exhaust',
				size: { shape: 'round', diameter },
				length: Math.max(length, Math.abs(rise)),
				rise,
				fittings: [{ kind: 'fixed', coefficient: 0.4, count: 2 }],
				open: true
			});
		}
		return {
			format: 'evendraft/design@1',
			air: { temperature: 40 },
			surroundings: { temperature: 5 },
			rows: rows.map(({ open, ...row }, place) => {
				const { flow, pressure } = parts[place] ?? { flow: 0.1, pressure: 0 };
				return open ? { ...row, outlet: { flow, loss: 20, pressure } } : row;
			})
		};
	});

function closes({ lines }: Account): number {
	const taken = lines.reduce((sum, { loss }) => sum + (loss ?? 0), 0);
	return Math.abs((lines[0]?.total ?? NaN) - taken - (lines.at(-1)?.total ?? NaN));
}

describe('the ledger', () => {
	it('closes every account, from the fan to the room or from the room to the fan', () => {
		fc.assert(
			fc.property(designs, (document) => {
				const input = inputOf(document);
				const { fan, paths } = input.solution;
				for (const account of reportOf(input).ledger.accounts) {
					expect(closes(account)).toBeLessThanOrEqual(CLOSE);
					const room = paths.find(({ outlet }) => outlet === account.outlet)?.roomPressure ?? NaN;
					const [start, end] = [account.lines[0]?.total ?? NaN, account.lines.at(-1)?.total ?? NaN];
					const supply = account.side === 'supply';
					expect(
						Math.abs((supply ? start : end) - (supply ? fan.supplyPressure : -fan.returnPressure))
					).toBeLessThanOrEqual(CLOSE);
					expect(Math.abs((supply ? end : start) - room)).toBeLessThanOrEqual(CLOSE);
				}
			})
		);
	});

	it('carries the total pressures of the solution from section to section', () => {
		fc.assert(
			fc.property(designs, (document) => {
				const input = inputOf(document);
				for (const { side, lines } of reportOf(input).ledger.accounts)
					for (const { kind, name, total } of lines) {
						if (kind !== 'row') continue;
						const [fanEnd, farEnd] = input.solution.rows[name]?.totalPressure ?? [NaN, NaN];
						expect(Math.abs(total - (side === 'supply' ? farEnd : fanEnd))).toBeLessThanOrEqual(CLOSE);
					}
			})
		);
	});

	it('puts the index path of each side first, then by spare pressure', () => {
		fc.assert(
			fc.property(designs, (document) => {
				const { accounts } = reportOf(inputOf(document)).ledger;
				for (const side of ['supply', 'exhaust']) {
					const of = accounts.filter((account) => account.side === side);
					expect(of.map(({ index }) => index)).toEqual(of.map((_, place) => place === 0));
					expect(of.map(({ spare }) => spare)).toEqual(of.map(({ spare }) => spare).sort((a, b) => a - b));
				}
			})
		);
	});

	it('carries sections already told forward in a long ledger, which closes all the same', () => {
		const { accounts } = reportOf(inputOf(treeOf(120))).ledger;
		const forward = accounts.flatMap(({ lines }) => lines).filter(({ kind }) => kind === 'forward');
		expect(forward.length).toBeGreaterThan(0);
		expect(Math.max(...accounts.map(closes))).toBeLessThanOrEqual(CLOSE);
		expect(accounts[0]?.lines.some(({ kind }) => kind === 'forward')).toBe(false);
		const told = new Set(
			accounts.flatMap(({ lines }) => lines.filter(({ kind }) => kind === 'row').map(({ name }) => name))
		);
		expect(told.size).toBe(120);
	});
});

describe('what needs an eye', () => {
	const input = inputOf(library);
	const report = reportOf(input);

	it('tells every flag of the solution once', () => {
		const told = report.checks.flatMap(({ rule, findings }) =>
			findings.map(({ row, message }) => [rule, row, message].join('|'))
		);
		const flags = input.solution.flags.map(({ rule, row, message }) => [rule, row, message].join('|'));
		expect(flags.length).toBeGreaterThan(5);
		expect([...told].sort()).toEqual([...flags].sort());
	});

	it('lists every value that is to be confirmed, with its section', () => {
		const open = Object.entries(input.solution.rows).flatMap(([tag, { items }]) =>
			items.filter(({ toBeConfirmed }) => toBeConfirmed).map(({ name }) => [tag, name] as const)
		);
		expect(open).toHaveLength(3);
		for (const [tag, name] of open)
			expect(report.toBeConfirmed.some(({ row, text }) => row === tag && text.includes(name))).toBe(true);
		expect(report.parts.flatMap(({ lines }) => lines).filter(({ toBeConfirmed }) => toBeConfirmed)).toHaveLength(3);
	});

	it('judges each limit of the design as the engine did', () => {
		const verdicts = Object.fromEntries(report.criteria.map(({ rule, verdict }) => [rule, verdict]));
		expect(verdicts).toEqual({
			'velocity-main': 'met',
			'velocity-run-out': 'met',
			'friction-rate': 'not met',
			'flexible-length': 'not met',
			'damper-missing': 'not met'
		});
	});

	it('says the caution of a special service', () => {
		const grease = reportOf(inputOf({ ...library, service: 'kitchen-grease' }));
		expect(grease.cautions.map(({ title }) => title)).toContain('Kitchen grease exhaust');
		expect(report.cautions.map(({ title }) => title)).not.toContain('Kitchen grease exhaust');
	});
});

describe('schedule, parts and sources', () => {
	const input = inputOf(library);
	const report = reportOf(input);

	it('has each section once, after the one that it joins', () => {
		const tags = report.schedule.rows.map(({ tag }) => tag);
		expect([...tags].sort()).toEqual(library.rows.map(({ tag }) => tag).sort());
		for (const { tag, joins } of library.rows)
			if (joins !== null) expect(tags.indexOf(joins)).toBeLessThan(tags.indexOf(tag));
	});

	it('marks the index paths of both sides and no other section', () => {
		const marked = report.schedule.rows.filter(({ index }) => index).map(({ tag }) => tag);
		expect(marked).toEqual(['S01', 'S02', 'S03', 'S05', 'S20']);
	});

	it('tells a flow that was entered from one that was added up', () => {
		const place = report.schedule.columns.findIndex(({ key }) => key === 'flow');
		const kinds = Object.fromEntries(report.schedule.rows.map(({ tag, cells }) => [tag, cells[place]?.kind]));
		expect(kinds).toMatchObject({ S01: 'computed', S04: 'entered', S20: 'entered' });
	});

	it('shows an en rule where there is no such part, never 0', () => {
		const place = report.schedule.columns.findIndex(({ key }) => key === 'equipment');
		const shown = Object.fromEntries(report.schedule.rows.map(({ tag, cells }) => [tag, cells[place]?.text]));
		expect(shown).toMatchObject({ S01: '33.0', S02: '–' });
	});

	it('numbers each source once and refers to none that is missing', () => {
		const numbers = report.sources.map(({ number }) => number);
		expect(numbers).toEqual(numbers.map((_, place) => place + 1));
		expect(new Set(report.sources.map(({ text }) => text)).size).toBe(report.sources.length);
		for (const { source } of report.parts.flatMap(({ lines }) => lines)) expect(numbers).toContain(source);
	});
});

describe('the report', () => {
	it('shows the figures of the solution, with the digits of the screen', () => {
		const input = inputOf(library);
		const { result, fan } = reportOf(input);
		const duty = formatPressure(input.solution.fan.totalPressure, 'SI');
		expect(result.cells[0]).toEqual({ label: 'Fan duty, total pressure', value: duty, unit: 'Pa', aside: null });
		const { staticPressure } = input.solution.fan;
		const line = fan.lines.find(({ label }) => label === 'Fan static pressure');
		expect(line?.value).toBe(formatPressure(staticPressure, 'SI'));
	});

	it('changes figures with the units, and no account', () => {
		const [si, ip] = [reportOf(inputOf(library)), reportOf(inputOf(library, { units: 'IP' }))];
		expect(ip.result.cells[0]?.unit).toBe('in. wg');
		expect(ip.result.cells[0]?.value).not.toBe(si.result.cells[0]?.value);
		const totals = (report: typeof si) => report.ledger.accounts.map(({ lines }) => lines.map(({ total }) => total));
		expect(totals(ip)).toEqual(totals(si));
	});

	it('prints the first sixteen digits of the hash, and none for a working sheet', () => {
		const saved = reportOf(inputOf(library));
		expect(saved.verification.code).toBe('7c1e 04bd 55a2 9f30');
		const sheet = reportOf(inputOf(library, { sha256: null, revision: null, versionNumber: null, savedAt: null }));
		expect(sheet.verification.code).toBeNull();
		expect(sheet.titleBlock.revision).toBe('–');
	});

	it('is plain data and the same each time', () => {
		const input = inputOf(library);
		const report = reportOf(input);
		expect(reportOf(structuredClone(input))).toEqual(report);
		expect(JSON.parse(JSON.stringify(report))).toEqual(report);
	});

	it('dates in UTC whatever the time zone of the machine', () => {
		const report = reportOf(inputOf(library, { savedAt: '2026-11-23T23:59:59.000Z' }));
		expect(report.titleBlock.date).toBe('23 Nov 2026');
	});
});
