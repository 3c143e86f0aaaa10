import { readingOf } from './reading-of';
import { SETTING_NAMES, type SettingName } from './setting-names';
import type { SettingField, Sheet } from './sheet';
import type { SheetProblem } from './sheet-problem';

/** Settings that were not understood, each by its name, and what the figures stand on meanwhile. */
export function settingProblems(sheet: Sheet): SheetProblem[] {
	const notRead = Object.entries(sheet.settings).flatMap(([field, cell]) => {
		if (!cell || cell.value !== null) return [];
		const { name, meanwhile } = namesOf(field as SettingField);
		const { message, expected } = readingOf('setting', field, cell);
		return [
			{ row: null, field: field as SettingField, message: `${name} – ${message} Meanwhile ${meanwhile}.`, expected }
		];
	});
	const { density, surroundings, elevation } = sheet.settings;
	if (!density || !surroundings || elevation) return notRead;
	const message = 'The air around the ducts is compared with a given density, so it must be known at what elevation.';
	return [...notRead, { row: null, field: 'elevation', message, expected: 'the elevation, as 0 m' }];
}

/** Units are switched in the title block, and have no line in the basis of design. */
function namesOf(field: SettingField): Pick<SettingName, 'name' | 'meanwhile'> {
	if (field === 'units') return { name: 'Units', meanwhile: 'the design is shown in SI' };
	return SETTING_NAMES[field];
}
