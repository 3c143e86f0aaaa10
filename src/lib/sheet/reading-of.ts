import type { UnitSystem } from '$lib/engine';
import { isRowField, isSettingField, ROW_READERS, SETTING_READERS } from './fields';

/** Why a typed text was not understood, in the words of its column. */
export function readingOf(kind: 'row' | 'setting', field: string, cell: { typed: string; units: UnitSystem }) {
	const reader =
		kind === 'row' ? isRowField(field) && ROW_READERS[field] : isSettingField(field) && SETTING_READERS[field];
	const reading = reader ? reader(cell.typed, cell.units) : null;
	if (reading && !reading.ok) return { message: reading.message, expected: reading.expected };
	if (reading)
		return {
			message: `“${cell.typed}” was not understood when it was typed, and is now.`,
			expected: 'the same text, entered again'
		};
	return { message: `“${cell.typed}” was not understood.`, expected: 'another text' };
}
