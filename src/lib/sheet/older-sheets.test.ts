import { describe, expect, it } from 'vitest';
import { DESIGN_FORMAT } from '$lib/engine';
import { solveSheet } from './solve-sheet';
import { SHEET_FORMAT, type Sheet } from './sheet';

const text = (typed: string, value: unknown) => ({ typed, units: 'SI', value });
const elbow = { word: 'elbow', count: 1, name: 'Elbow', parameters: {}, picture: 'elbow', toBeConfirmed: false };

/** As it was stored before parts had methods, rows a lining, and designs a standard density: cells with their values. */
const STORED = {
	format: SHEET_FORMAT,
	settings: { leakage: text('CL24', 'CL24') },
	rows: [
		{
			id: '00000000-0000-4000-8000-000000000001',
			cells: {
				tag: text('A', 'A'),
				size: text('oval 510x255', { shape: 'oval', width: 0.51, height: 0.255 }),
				length: text('5', 5),
				parts: text('elbow plane width, transition C0.1', {
					junction: null,
					fittings: [
						{ ...elbow, kind: 'elbow-smooth', parameters: { plane: 'width' } },
						{ ...elbow, word: 'transition', kind: 'fixed', name: 'Transition', coefficient: 0.1, picture: 'transition' }
					],
					equipment: []
				}),
				flow: text('300', 0.3),
				outlet: text('20', { loss: 20, lossIs: 'total', toBeConfirmed: false })
			}
		}
	]
} as unknown as Sheet;

describe('a sheet that was stored before the catalogue grew', () => {
	it('is read as it was, with no key that it does not name', () => {
		const { document, problems, solution } = solveSheet(JSON.parse(JSON.stringify(STORED)) as Sheet);
		expect(problems).toEqual([]);
		expect(solution).not.toBeNull();
		expect(document).toEqual({
			format: DESIGN_FORMAT,
			title: '',
			air: { temperature: 20, relativeHumidity: 0.5, elevation: 0 },
			material: 'galvanized-steel',
			leakage: { cl: 24 },
			rows: [
				{
					id: '00000000-0000-4000-8000-000000000001',
					...{ tag: 'A', joins: null, side: 'supply', length: 5, serves: '', rise: 0, equipment: [] },
					size: { shape: 'oval', width: 0.51, height: 0.255 },
					fittings: [
						// The long axis lies in the plane of the bend: an oval's own elbow calls that hard.
						{ kind: 'oval-elbow-smooth', name: 'Elbow', bend: 'hard' },
						{ kind: 'fixed', name: 'Transition', coefficient: 0.1 }
					],
					outlet: { flow: 0.3, loss: 20, lossIs: 'total', toBeConfirmed: false, pressure: 0 }
				}
			]
		});
	});

	it('says of a text that was not understood then, and is now, how it comes to count', () => {
		const [row] = STORED.rows;
		const cells = { ...row?.cells, parts: text('fire damper', null) };
		const sheet = { ...STORED, rows: [{ ...row, cells }] } as unknown as Sheet;
		expect(solveSheet(sheet).problems).toMatchObject([
			{
				field: 'parts',
				message: '“fire damper” was not understood when it was typed, and is now.',
				expected: 'the same text, entered again'
			}
		]);
	});
});
