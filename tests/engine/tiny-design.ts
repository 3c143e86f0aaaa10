import type { DesignDocument, DesignRow, Fitting, FittingEntry } from '$lib/engine';

/** One change to a design. */
export type Patch = (document: DesignDocument) => DesignDocument;
type RowPatch = Partial<DesignRow> | ((row: DesignRow) => DesignRow);

/** A fitting with the parameters of its kind. */
export const part = (one: FittingEntry): Fitting => one;
const open = part({ kind: 'damper-butterfly', angle: 0 });

/** A main that divides in two behind a supply fan, as a reviewer would have it. */
export const SOUND: DesignDocument = {
	format: 'evendraft/design@1',
	air: { temperature: 20 },
	leakage: { class: 'C', testPressure: 500 },
	criteria: { mainVelocity: 8, runOutVelocity: 6, frictionRate: 2, flexibleLength: 2 },
	record: {
		...{ codes: 'the local mechanical code, its edition', noiseCriterion: 'NC 35', tolerance: '-5 to +10 %' },
		...{ originator: 'A', checker: 'B' }
	},
	rows: [
		{
			...{ tag: 'A', joins: null, side: 'supply', size: { shape: 'round', diameter: 0.4 }, length: 8 },
			fittings: [part({ kind: 'round-elbow-segmented', radiusRatio: 1.5 })],
			equipment: [{ name: 'Coil', loss: 30 }]
		},
		{
			...{ tag: 'B', joins: 'A', side: 'supply', size: { shape: 'round', diameter: 0.25 }, length: 6 },
			junction: { kind: 'fixed', coefficient: 0.6 },
			fittings: [open],
			outlet: { flow: 0.15, loss: 20, lossIs: 'total' }
		},
		{
			...{ tag: 'C', joins: 'A', side: 'supply', size: { shape: 'round', diameter: 0.355 }, length: 6 },
			junction: { kind: 'tee', leg: 'straight' },
			fittings: [open],
			outlet: { flow: 0.45, loss: 20, lossIs: 'total' }
		}
	]
};

export const same: Patch = (document) => document;
/** One change after the other. */
export const both =
	(...patches: readonly Patch[]): Patch =>
	(document) =>
		patches.reduce((made, patch) => patch(made), document);
export const design =
	(patch: Partial<DesignDocument>): Patch =>
	(document) => ({ ...document, ...patch });
export const without =
	(key: keyof DesignDocument): Patch =>
	(document) => {
		const { [key]: _left, ...rest } = document;
		return rest as DesignDocument;
	};

const patched = (one: DesignRow, patch: RowPatch) => (typeof patch === 'function' ? patch(one) : { ...one, ...patch });
export const row =
	(tag: string, patch: RowPatch): Patch =>
	(document) => ({ ...document, rows: document.rows.map((one) => (one.tag === tag ? patched(one, patch) : one)) });
export const every =
	(patch: RowPatch): Patch =>
	(document) => ({ ...document, rows: document.rows.map((one) => patched(one, patch)) });
export const withoutKeys =
	(...keys: readonly (keyof DesignRow)[]) =>
	(one: DesignRow): DesignRow =>
		Object.fromEntries(
			Object.entries(one).filter(([key]) => !keys.some((left) => left === key))
		) as unknown as DesignRow;
/** The branch alone, at the fan. */
export const alone: Patch = (document) => ({
	...document,
	rows: document.rows.flatMap((one) => (one.tag === 'B' ? [{ ...one, joins: null }] : []))
});

export const rectangular = (width: number, height: number) =>
	({ size: { shape: 'rectangular', width, height } }) satisfies Partial<DesignRow>;
export const round = (diameter: number) => ({ size: { shape: 'round', diameter } }) satisfies Partial<DesignRow>;
/** The branch with another loss at its outlet. */
export const outletLoss = (loss: number): Patch => row('B', { outlet: { flow: 0.15, loss, lossIs: 'total' } });
export const exhaust: Patch = every({ side: 'exhaust' });

/** One more row, which brings outdoor air to the fan. */
export const outdoor =
	(more: Partial<DesignRow> = {}): Patch =>
	(document) => ({
		...document,
		rows: [
			...document.rows,
			{
				...{ tag: 'O', joins: null, side: 'outdoor', ...round(0.4), length: 4 },
				outlet: { flow: 0.6, loss: 15 },
				...more
			}
		]
	});
/** A filter in the main. */
export const filter = (state: 'clean' | 'mean' | 'dirty'): Patch =>
	row('A', { equipment: [{ name: 'Filter', filter: { clean: 60, final: 150, state }, atFlow: 0.6 }] });
