import { authorOf } from '$lib/engine';
import { readingOf } from './reading-of';
import { methodSetting } from './methods';
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
	const { density, surroundings, elevation, testPressure, leakage } = sheet.settings;
	const lacking: SheetProblem[] = [];
	if (density && surroundings && !elevation) {
		const message = 'The air around the ducts is compared with a given density, so it must be known at what elevation.';
		lacking.push({ row: null, field: 'elevation', message, expected: 'the elevation, as 0 m' });
	}
	if (testPressure && !leakage) {
		const message = 'What may leak at the test pressure goes by a leakage class, and none is named.';
		lacking.push({ row: null, field: 'leakage', message, expected: 'the leakage class, as C; or no test pressure' });
	}
	return lacking.length ? [...notRead, ...lacking] : notRead;
}

/** Units are switched in the title block, and have no line in the basis of design. */
function namesOf(field: SettingField): Pick<SettingName, 'name' | 'meanwhile'> {
	if (field === 'units') return { name: 'Units', meanwhile: 'the design is shown in SI' };
	const method = methodSetting(field);
	if (method) {
		const { entry, methods } = method;
		const meanwhile = `it is computed by ${authorOf(methods[0] ?? '')}`;
		return { name: `Method of “${entry.name}”`, meanwhile };
	}
	return SETTING_NAMES[field as keyof typeof SETTING_NAMES];
}
