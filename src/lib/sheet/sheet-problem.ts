import type { RowField, SettingField } from './sheet';

/** Something that a person must mend, at its cell. `row` is null for a setting. */
export interface SheetProblem {
	readonly row: string | null;
	readonly field: RowField | SettingField;
	readonly message: string;
	readonly expected: string;
}
