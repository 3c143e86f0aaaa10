import { readKeys } from '../document/read-keys';
import type { DesignDocument, Flag } from '../document/types';

/** Keys of the document that this version does not read: a slip of the hand, or another version's. */
export function unreadKeyFlags(document: DesignDocument, flags: Flag[]): void {
	const look = (holder: object | undefined, known: ReadonlySet<string>, where: string, row: string | null) => {
		if (holder === undefined) return;
		for (const key in holder) {
			if (known.has(key)) continue;
			flags.push({
				rule: 'key-not-read',
				row,
				severity: 'note',
				message: `The key ${JSON.stringify(key)} ${where} is not read by this version and changes nothing.`,
				basis: 'schema of the design document'
			});
		}
	};
	look(document, readKeys.design, 'of the document', null);
	look(document.air, 'density' in document.air ? readKeys.airByDensity : readKeys.air, 'of the air', null);
	look(document.criteria, readKeys.criteria, 'of the criteria', null);
	look(document.leakage, readKeys.leakage, 'of the leakage', null);
	look(document.fan, readKeys.fan, 'of the fan', null);
	for (const row of document.rows) {
		look(row, readKeys.row, 'of the row', row.tag);
		look(row.size, row.size.shape === 'round' ? readKeys.round : readKeys.sides, 'of the size', row.tag);
		look(row.flexible, readKeys.flexible, 'of the flexible duct', row.tag);
		look(row.leakage, readKeys.rowLeakage, 'of the leakage', row.tag);
		look(row.lining, readKeys.lining, 'of the lining', row.tag);
		// Of a kind of the catalogue every key is a parameter, and a strange one a problem.
		if (row.junction?.kind === 'fixed') look(row.junction, readKeys.junction, 'of the junction', row.tag);
		look(row.outlet, readKeys.outlet, 'of the outlet', row.tag);
		for (const one of row.fittings ?? [])
			if (one.kind === 'fixed') look(one, readKeys.fitting, 'of a fitting', row.tag);
		for (const one of row.equipment ?? []) {
			look(one, readKeys.equipment, 'of a piece of equipment', row.tag);
			look(one.filter, readKeys.filter, 'of a filter', row.tag);
		}
	}
}
