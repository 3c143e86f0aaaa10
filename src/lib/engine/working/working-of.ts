import type { DesignDocument, DesignRow, Solution } from '../document/types';
import { Chain, entered, standing, type Ref } from './chain';
import { RowWorking, type Ground } from './row-working';
import type { Working } from './types';

/** Figures of a row that can be worked. */
export const ROW_FIGURES = [
	...(['flow', 'density', 'area', 'hydraulicDiameter', 'velocity', 'velocityPressure', 'reynolds'] as const),
	...(['frictionFactor', 'frictionRate', 'frictionLoss', 'flexibleLoss', 'fittingLoss', 'junctionLoss'] as const),
	...(['equipmentLoss', 'outletLoss', 'thermalGravity', 'loss', 'spare'] as const)
] as const;
export type RowFigure = (typeof ROW_FIGURES)[number];

/** A figure of a solution. */
export type FigureName =
	| { readonly row: string; readonly figure: RowFigure }
	| { readonly path: string; readonly figure: 'loss' | 'spare' }
	| { readonly fan: 'totalPressure' | 'supplyPressure' | 'returnPressure' };

/**
 * How a figure of a solution comes about: every step with its formula, values and source, from what was entered to the
 * figure itself. Nothing is taken from the solution that can be worked from the document.
 *
 * @param document the design document, SI units
 * @param solution what `solveDesign` gave for it
 * @param figure which figure
 * @returns the steps; null where the design has no such row, path or figure
 */
export function workingOf(document: DesignDocument, solution: Solution, figure: FigureName): Working | null {
	const chain = new Chain();
	const ground = groundOf(document, solution);
	const ref = refOf(ground, chain, figure);
	if (!ref) return null;
	return { figure: nameOf(figure), value: ref.value, unit: ref.unit, steps: chain.steps };
}

function nameOf(figure: FigureName): string {
	if ('fan' in figure) return `fan.${figure.fan}`;
	return 'row' in figure ? `rows.${figure.row}.${figure.figure}` : `paths.${figure.path}.${figure.figure}`;
}

function groundOf(document: DesignDocument, solution: Solution): Ground {
	const rows = new Map<string, DesignRow>(document.rows.map((row) => [row.tag, row]));
	const joining = new Map<string, string[]>();
	for (const { tag, joins } of document.rows) {
		if (joins === null) continue;
		const list = joining.get(joins);
		if (list) list.push(tag);
		else joining.set(joins, [tag]);
	}
	// The engine adds from the last tag to the first.
	for (const list of joining.values()) list.sort((a, b) => (a < b ? 1 : -1));
	return { document, solution, rows, joining };
}

function refOf(ground: Ground, chain: Chain, figure: FigureName): Ref | null {
	if ('fan' in figure) return dutyOf(ground, chain, figure.fan);
	if ('path' in figure) {
		if (!ground.solution.paths.some(({ outlet }) => outlet === figure.path)) return null;
		return figure.figure === 'loss' ? pathLoss(ground, chain, figure.path) : spareOf(ground, chain, figure.path);
	}
	const [row, solved] = [ground.rows.get(figure.row), ground.solution.rows[figure.row]];
	if (!row || !solved) return null;
	if (figure.figure !== 'spare') return new RowWorking(ground, chain, row, solved)[figure.figure]();
	const best = ground.solution.paths
		.filter(({ rows }) => rows.includes(row.tag))
		.reduce<Solution['paths'][number] | null>(
			(least, path) => (!least || path.spare < least.spare ? path : least),
			null
		);
	return best && spareOf(ground, chain, best.outlet);
}

/** The losses of a path's rows, added from the fan outward. */
function pathLoss(ground: Ground, chain: Chain, outlet: string): Ref {
	const path = ground.solution.paths.find((one) => one.outlet === outlet);
	const losses = (path?.rows ?? []).map((tag) => {
		const [row, solved] = [ground.rows.get(tag), ground.solution.rows[tag]];
		if (!row || !solved) throw new Error(`no row ${tag}`);
		return [tag, new RowWorking(ground, chain, row, solved).loss()] as const;
	});
	return chain.work(
		'sum-losses',
		{ symbol: 'Δp', name: `Loss of the path to ${outlet}`, unit: 'Pa' },
		Object.fromEntries(losses)
	);
}

function requirementOf(ground: Ground, chain: Chain, outlet: string): Ref {
	const row = ground.rows.get(outlet);
	const pressure = row?.outlet?.pressure;
	return chain.work(
		'requirement',
		{ symbol: 'p', name: `Requirement of the path to ${outlet}`, unit: 'Pa' },
		{
			Δp: pathLoss(ground, chain, outlet),
			room:
				pressure === undefined
					? standing('Pressure of the room', 0, 'Pa')
					: entered('Pressure of the room', pressure, 'Pa'),
			side: entered('Side', row?.side === 'supply' ? 'supply' : 'other')
		}
	);
}

function spareOf(ground: Ground, chain: Chain, outlet: string): Ref | null {
	const side = ground.rows.get(outlet)?.side;
	const index = side === 'supply' ? ground.solution.index.supply : ground.solution.index.return;
	if (index === null) return null;
	return chain.work(
		'difference',
		{ symbol: 'p', name: `Spare pressure of the path to ${outlet}`, unit: 'Pa' },
		{
			a: requirementOf(ground, chain, index),
			b: requirementOf(ground, chain, outlet)
		}
	);
}

function dutyOf(
	ground: Ground,
	chain: Chain,
	which: 'totalPressure' | 'supplyPressure' | 'returnPressure'
): Ref | null {
	const { supply, return: other } = ground.solution.index;
	const side = (outlet: string | null, name: string): Ref =>
		outlet === null
			? chain.work('sum-losses', { symbol: 'p', name, unit: 'Pa' }, {})
			: requirementOf(ground, chain, outlet);
	if (which === 'supplyPressure') return side(supply, 'No supply');
	if (which === 'returnPressure') return side(other, 'No return');
	return chain.work(
		'duty',
		{ symbol: 'p', name: 'Fan total pressure', unit: 'Pa' },
		{
			supply: side(supply, 'No supply'),
			other: side(other, 'No return')
		}
	);
}
