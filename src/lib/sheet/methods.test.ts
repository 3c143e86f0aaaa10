import { describe, expect, it } from 'vitest';
import { catalogue, validateDocument } from '$lib/engine';
import { sheetOf, type TypedRow, type TypedSettings } from '../../../tests/sheet/any-sheet';
import { SETTING_READERS } from './fields';
import { METHOD_SETTINGS } from './methods';
import { methodEdits, together } from './settings';
import { solveSheet } from './solve-sheet';

const ROWS: TypedRow[] = [
	{ tag: 'A', size: 'Ø400', length: '5' },
	{ tag: 'B', joins: 'A', size: 'Ø200', length: '4', flow: '100', outlet: '10', parts: 'tee branch; elbow r1.5' },
	{ tag: 'C', joins: 'A', size: 'Ø355', length: '6', flow: '300', outlet: '10', parts: 'elbow r1.5 by ito' }
];
const solved = (settings: TypedSettings) => {
	const found = solveSheet(sheetOf(ROWS, settings));
	if (!found.solution) throw new Error(found.problems.map(({ message }) => message).join(' '));
	return { ...found, solution: found.solution };
};
const methodOf = ({ solution }: ReturnType<typeof solved>, row: string, kind: string) =>
	solution.rows[row]?.items.find((item) => item.kind === kind)?.catalogue?.methodKey;

describe('the methods of a design', () => {
	it('are one setting for each entry that has rivals', () => {
		const rivalled = catalogue.filter(({ rivals }) => rivals?.length).map(({ key }) => key);
		expect(METHOD_SETTINGS.map(({ entry }) => entry.key)).toEqual(rivalled);
		expect(rivalled.length).toBeGreaterThan(10);
	});

	it.each(METHOD_SETTINGS.flatMap(({ field, methods }) => methods.map((method) => [field, method] as const)))(
		'%s takes %s, and the document with it is sound',
		(field, method) => {
			expect(SETTING_READERS[field]?.(method, 'SI')).toMatchObject({ ok: true, value: method });
			const { document, problems } = solveSheet(sheetOf(ROWS, { [field]: method }));
			expect(problems).toEqual([]);
			expect(document?.methods).toEqual({ [field.slice('method-'.length)]: method });
			expect(validateDocument(document).ok).toBe(true);
		}
	);

	it('count where a part names no author of its own', () => {
		const [plain, chosen] = [solved({}), solved({ 'method-round-elbow-smooth': 'rennels', 'method-tee': 'Crane' })];
		expect(plain.document).not.toHaveProperty('methods');
		expect(methodOf(plain, 'B', 'round-elbow-smooth')).toBe('idelchik');
		expect(methodOf(chosen, 'B', 'round-elbow-smooth')).toBe('rennels');
		expect(methodOf(chosen, 'C', 'round-elbow-smooth')).toBe('ito');
		expect(methodOf(chosen, 'B', 'tee')).toBe('crane');
		expect(chosen.solution.fan.totalPressure).not.toBe(plain.solution.fan.totalPressure);
	});

	it('are read by the author’s printed name too', () => {
		const reader = SETTING_READERS['method-gradual-expansion'];
		expect(reader?.('Idelchik, table', 'SI')).toMatchObject({
			ok: true,
			value: 'idelchik-table',
			words: 'Idelchik, table'
		});
	});

	it('are written by the form only where they differ, and cleared by a blank', () => {
		const sheet = sheetOf(ROWS, { 'method-tee': 'crane' });
		const sent = { name: 'AHU-1', 'method-tee': 'crane', 'method-wye': '' };
		expect(methodEdits(sheet, sent, 'SI')).toBeNull();
		expect(methodEdits(sheet, { ...sent, 'method-tee': '' }, 'SI')).toEqual({
			...{ kind: 'batch', edits: [{ kind: 'set', row: null, field: 'method-tee', typed: '', units: 'SI' }] }
		});
		expect(methodEdits(sheet, { 'method-nothing': 'x' }, 'SI')).toBeNull();
		expect(together(null, null)).toBeNull();
	});
});
