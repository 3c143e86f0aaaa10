/** Inputs for the tests of report and PDF: an invented library, and a tree of any size. */
import { solveDesign, type DesignDocument, type DesignRow } from '$lib/engine';
import type { ReportInput } from './input';

type Part = NonNullable<DesignRow['fittings']>[number];
const fixed = (name: string, coefficient: number, count = 1): Part => ({ kind: 'fixed', name, coefficient, count });
const round = (diameter: number) => ({ shape: 'round', diameter }) as const;
const rectangular = (width: number, height: number) => ({ shape: 'rectangular', width, height }) as const;
const split = (name: string, coefficient: number) => ({ kind: 'fixed', name, coefficient });
const outlet = (name: string, flow: number, loss: number) => ({ name, flow, loss });
const flexible = { length: 1.2, factor: 4 };
const bend = (count = 1): Part => ({ kind: 'round-elbow-smooth', radiusRatio: 1, count }) as Part;
const damper = fixed('Volume damper, open', 0.2);

/** An invented supply system with its outdoor air, some values still open. */
export const library: DesignDocument = {
	format: 'evendraft/design@1',
	title: 'AHU-1',
	air: { temperature: 20, relativeHumidity: 0.5, elevation: 0 },
	material: 'galvanized-steel',
	criteria: { mainVelocity: 6, runOutVelocity: 5, frictionRate: 1.5, flexibleLength: 1.5, damperAtOutlet: true },
	rows: [
		{
			tag: 'S01',
			joins: null,
			side: 'supply',
			size: rectangular(0.6, 0.35),
			length: 6.5,
			fittings: [fixed('Discharge transition', 0.1), fixed('Radius bend', 0.23, 2)],
			equipment: [
				{ name: 'Silencer', loss: 25, toBeConfirmed: true },
				{ name: 'Fire damper FD-01', loss: 8 }
			]
		},
		{
			tag: 'S02',
			joins: 'S01',
			side: 'supply',
			size: rectangular(0.45, 0.35),
			length: 5,
			junction: split('Split, straight way', 0.1)
		},
		{
			tag: 'S03',
			joins: 'S02',
			side: 'supply',
			size: round(0.2),
			length: 4.2,
			junction: split('45° shoe take-off', 0.6),
			fittings: [damper],
			equipment: [{ name: 'Fire damper FD-02', loss: 6 }]
		},
		{
			tag: 'S04',
			joins: 'S03',
			side: 'supply',
			serves: '0.04 Staff office',
			size: round(0.16),
			length: 2.8,
			flexible,
			junction: split('Tee, straight way', 0.15),
			fittings: [bend(), damper],
			outlet: outlet('T9', 0.08, 18)
		},
		{
			tag: 'S05',
			joins: 'S03',
			side: 'supply',
			serves: '0.05 Study room',
			size: round(0.125),
			length: 5.6,
			flexible,
			junction: split('Tee, branch', 0.8),
			fittings: [bend(2), damper],
			outlet: { ...outlet('T10', 0.06, 16), toBeConfirmed: true }
		},
		{
			tag: 'S06',
			joins: 'S02',
			side: 'supply',
			serves: '0.01 Main reading room, north bay beside the periodicals, α–ω',
			size: round(0.2),
			length: 3,
			flexible: { length: 3.5 },
			junction: split('45° shoe take-off', 0.6),
			fittings: [bend()],
			outlet: outlet('T1', 0.15, 22)
		},
		{
			tag: 'S07',
			joins: 'S01',
			side: 'supply',
			serves: '0.03 Community room',
			size: rectangular(0.4, 0.3),
			length: 9,
			fittings: [damper],
			outlet: outlet('T7', 0.46, 16)
		},
		{
			tag: 'S20',
			joins: null,
			side: 'outdoor',
			size: rectangular(0.8, 0.4),
			length: 4,
			fittings: [{ ...fixed('Mitred bend with vanes', 0.15), toBeConfirmed: true }],
			equipment: [{ name: 'Weather louvre', loss: 25 }],
			outlet: { name: 'Louvre', flow: 0.75 }
		}
	]
};

const LINE = ['Reading room', 'Office', 'A room whose name is as long as the one who wrote it wanted it', 'Store'];

/** A trunk with branches, a run-out at each: `count` rows. */
export function treeOf(count: number, more: Partial<DesignRow> = {}): DesignDocument {
	const rows: DesignRow[] = [];
	for (let i = 0; rows.length < count; i += 1) {
		const joins = i === 0 ? null : `M${i - 1}`;
		const last = rows.length + 2 >= count;
		rows.push({
			tag: `M${i}`,
			joins,
			side: 'supply',
			size: rectangular(1.2, 0.6),
			length: 4,
			...(joins === null ? {} : { junction: split('Straight way', 0.05) }),
			...(last && rows.length + 1 === count ? { outlet: outlet('End', 0.1, 20) } : {})
		});
		if (rows.length === count) break;
		rows.push({
			tag: `R${i}`,
			joins: `M${i}`,
			side: 'supply',
			serves: LINE[i % LINE.length] ?? '',
			size: round(0.2),
			length: 3 + (i % 7),
			flexible,
			junction: split('Take-off', 0.6),
			fittings: [bend(), damper],
			outlet: outlet(`T${i}`, 0.1, 20),
			...more
		});
	}
	return { format: 'evendraft/design@1', air: { temperature: 20 }, rows };
}

/** A whole input around a document; every part can be replaced. */
export function inputOf(document: DesignDocument, more: Partial<ReportInput> = {}): ReportInput {
	const solved = solveDesign(document);
	if (!solved.ok) throw new Error(solved.problems.map(({ path, message }) => `${path} ${message}`).join('\n'));
	return {
		heading: {
			firm: 'Brackenfold Mechanical Studio',
			client: 'Larkmoor Town Council',
			projectNumber: 'BMS-2418',
			projectName: 'Larkmoor Public Library',
			place: 'ground floor and mezzanine',
			system: 'AHU-1 supply',
			service: ''
		},
		units: 'SI',
		paper: 'A4',
		revision: 'P02',
		versionNumber: 2,
		status: 'issued-for-review',
		savedAt: '2026-11-23T14:32:10.000Z',
		printedAt: '2026-11-24T09:05:00.000Z',
		preparedBy: 'design.engineer@brackenfold.example',
		sha256: '7c1e04bd55a29f3018c6d2b7a4e5f60718293a4b5c6d7e8f9011223344556677',
		note: 'S05 Ø125 to Ø160; damper added in S11.',
		revisions: [
			{
				revision: 'P02',
				savedAt: '2026-11-23T14:32:10.000Z',
				status: 'issued-for-review',
				note: 'S05 Ø125 to Ø160; S12 flexible 3.5 to 1.2 m; damper added in S11. Duty 171.8 to 148.0 Pa.',
				by: 'design.engineer'
			},
			{
				revision: 'P01',
				savedAt: '2026-11-09T10:00:00.000Z',
				status: 'work-in-progress',
				note: 'First issue.',
				by: 'design.engineer'
			}
		],
		document,
		solution: solved.solution,
		...more
	};
}
