/** The settings as a form edits them: typed text in, one edit out. */
import { editText, type UnitSystem } from '$lib/engine';
import type { Edit } from './edit';
import { METHOD_SETTINGS } from './methods';
import { SETTING_NAMES, type SettingName } from './setting-names';
import { unitsOf, type Cell, type SettingField, type Sheet } from './sheet';
import { MOST_TYPED } from './storable-text';

type Typed<F extends string> = { typedIn: UnitSystem } & Record<F, string>;

/** Each setting as it was typed; where that was in other units, converted with all its digits. */
export function settingsToEdit<F extends keyof typeof SETTING_NAMES>(sheet: Sheet, fields: readonly F[]): Typed<F> {
	const units = unitsOf(sheet);
	const texts = fields.map((field) => [field, textOf(sheet, field, units)]);
	return { typedIn: units, ...(Object.fromEntries(texts) as Record<F, string>) };
}

function textOf(sheet: Sheet, field: keyof typeof SETTING_NAMES, units: UnitSystem): string {
	const cell = sheet.settings[field] as Cell<unknown> | undefined;
	if (!cell) return '';
	const about: SettingName = SETTING_NAMES[field];
	if (cell.units === units || typeof cell.value !== 'number' || !about.quantity || about.quantity === 'size')
		return cell.typed;
	return editText(about.quantity, cell.value, units);
}

/** One edit that writes the settings whose text differs from what stands there; null when none does. */
export function settingEdits<F extends keyof typeof SETTING_NAMES>(
	sheet: Sheet,
	typed: Record<F, string>,
	units: UnitSystem,
	fields: readonly F[]
): Edit | null {
	const edits = fields
		.filter((field) => typed[field].trim() !== textOf(sheet, field, units).trim())
		.map((field) => ({ kind: 'set' as const, row: null, field: field as SettingField, typed: typed[field], units }));
	return edits.length ? { kind: 'batch', edits } : null;
}

/** The same for the methods: those that were sent and differ. */
export function methodEdits(sheet: Sheet, sent: Readonly<Record<string, string>>, units: UnitSystem): Edit | null {
	const edits = METHOD_SETTINGS.flatMap(({ field }) => {
		const typed = sent[field]?.slice(0, MOST_TYPED);
		const before = sheet.settings[field]?.typed ?? '';
		if (typed === undefined || typed.trim() === before.trim()) return [];
		return [{ kind: 'set' as const, row: null, field, typed, units }];
	});
	return edits.length ? { kind: 'batch', edits } : null;
}

/** Two edits as one step; null where there is neither. */
export function together(...edits: readonly (Edit | null)[]): Edit | null {
	const single = edits.flatMap((edit) => (edit === null ? [] : edit.kind === 'batch' ? edit.edits : [edit]));
	return single.length ? { kind: 'batch', edits: single } : null;
}
