/** What a cell shows, and what its editor begins with. */
import {
	editSize,
	editText,
	formatFlow,
	formatLength,
	formatPressure,
	formatSize,
	formatTemperature,
	materials,
	type UnitSystem
} from '$lib/engine';
import { SIDES } from './fields';
import type { Parts } from './parts';
import { leakageName } from './read-leakage';
import { liningToEdit, thicknessText } from './read-lining';
import type { Cell, OutletLoss, RowField, RowValues, SheetRow } from './sheet';

type Shown = { readonly [F in RowField]: (value: RowValues[F], units: UnitSystem) => string };

const SHOWN: Shown = {
	tag: (value) => value,
	joins: (value) => value,
	side: (value) => SIDES.find(({ key }) => key === value)?.name.toLowerCase() ?? value,
	serves: (value) => value,
	flow: formatFlow,
	size: formatSize,
	length: formatLength,
	rise: formatLength,
	flex: formatLength,
	material: (value) => Object.values(materials).find(({ key }) => key === value)?.name ?? value,
	lining: ({ thickness, sizeIs }, units) => `${thicknessText(thickness, units)}${sizeIs === 'metal' ? ' metal' : ''}`,
	leakage: leakageName,
	temperature: formatTemperature,
	parts: () => '',
	outlet: (value, units) => outletText(value, units),
	pressure: formatPressure
};

function outletText({ loss, lossIs, coefficient }: OutletLoss, units: UnitSystem): string {
	if (coefficient !== undefined) return `C ${coefficient}`;
	if (loss === null) return 'open';
	return lossIs === 'static' ? `${formatPressure(loss, units)} s` : formatPressure(loss, units);
}

const cellOfRow = (row: SheetRow, field: RowField) => row.cells[field] as Cell<RowValues[RowField]> | undefined;

/** A cell never changes, so its text is made once. */
const texts = { SI: new WeakMap<Cell<unknown>, string>(), IP: new WeakMap<Cell<unknown>, string>() };

/** The text of an entered cell in the units of the screen; what was not understood stays as it was typed. */
export function shownText(row: SheetRow, field: RowField, units: UnitSystem): string {
	const cell = cellOfRow(row, field);
	if (!cell) return '';
	if (cell.value === null || field === 'parts') return cell.typed;
	const known = texts[units].get(cell);
	if (known !== undefined) return known;
	const text = (SHOWN[field] as (value: unknown, units: UnitSystem) => string)(cell.value, units);
	texts[units].set(cell, text);
	return text;
}

/** What a blank cell stands for, to be shown greyed: the outlet at the end of a run is an open end. */
export function impliedText(row: SheetRow, field: RowField, isEnd: boolean): string {
	if (field !== 'outlet' || !isEnd || row.cells.outlet || !row.cells.flow) return '';
	const fittings = (row.cells.parts?.value as Parts | null | undefined)?.fittings ?? [];
	return fittings.some(({ word, kind }) => kind !== 'fixed' && (word === 'entry' || word === 'exit')) ? '' : 'open';
}

/** The text that an editor begins with: as typed, or, where that was in other units, converted with all its digits. */
export function textToEdit(row: SheetRow, field: RowField, units: UnitSystem): string {
	const cell = cellOfRow(row, field);
	if (!cell) return '';
	if (cell.units === units || cell.value === null) return cell.typed;
	switch (field) {
		case 'size':
			return editSize(cell.value as RowValues['size'], units);
		case 'flow':
			return editText('flow', cell.value as number, units);
		case 'length':
		case 'rise':
		case 'flex':
			return editText('length', cell.value as number, units);
		case 'temperature':
			return editText('temperature', cell.value as number, units);
		case 'lining':
			return liningToEdit(cell.value as RowValues['lining'], units);
		case 'pressure':
			return editText('pressure', cell.value as number, units);
		case 'outlet': {
			const { loss, lossIs, toBeConfirmed, description } = cell.value as OutletLoss;
			if (loss === null) return cell.typed;
			const before = description === undefined ? '' : `${description} `;
			const basis = lossIs === 'static' ? ' static' : '';
			return `${before}${editText('pressure', loss, units)}${basis}${toBeConfirmed ? '?' : ''}`;
		}
		default:
			return cell.typed;
	}
}

/** The text that is copied to other programs: as shown, without grouping of thousands. */
export function textToCopy(row: SheetRow, field: RowField, units: UnitSystem): string {
	return textToEdit(row, field, units);
}
