import type { DesignDocument, Flag, Service } from '../document/types';

const CAUTIONS: Readonly<Record<Exclude<Service, 'general'>, string>> = {
	'kitchen-grease':
		'Kitchen grease exhaust: construction, clearance, cleaning access, velocity and fire protection follow codes that are not checked here.',
	laboratory: 'Laboratory or fume-hood exhaust: containment, materials, dilution and discharge are not checked here.',
	hazardous: 'Hazardous, dusty or explosive exhaust: transport velocity, materials and ignition are not checked here.',
	'smoke-control':
		'Smoke control: leakage, temperature, reliability and the sequence of operation are not checked here.'
};

/** Words that hint at a service nobody has named. */
const HINTS: readonly (readonly [RegExp, Exclude<Service, 'general'>])[] = [
	[/\b(kitchen|grease|cooking|range hood)\b/i, 'kitchen-grease'],
	[/\b(laborator(y|ies)|fume|fume hood)\b/i, 'laboratory'],
	[/\b(hazardous|explosive|dust|welding)\b/i, 'hazardous'],
	[/\b(smoke (control|exhaust|extract))\b/i, 'smoke-control']
];
const BASIS = 'outside the scope of a pressure calculation: the adopted codes and a licensed professional govern';

/** The caution of the service of the design; where none is named, of what the rows seem to serve. */
export function serviceFlags(document: DesignDocument): Flag[] {
	const { service } = document;
	if (service !== undefined) {
		if (service === 'general') return [];
		const message = CAUTIONS[service];
		return [{ rule: 'service-caution', row: null, severity: 'caution', message, basis: BASIS }];
	}
	const flags: Flag[] = [];
	for (const row of document.rows) {
		const name = row.outlet?.name ?? '';
		const { serves = '' } = row;
		if (name === '' && serves === '') continue;
		const hint = HINTS.find(([pattern]) => pattern.test(serves) || pattern.test(name));
		if (hint === undefined) continue;
		const message = `${CAUTIONS[hint[1]]} Name the service of the design to settle this.`;
		flags.push({ rule: 'service-caution', row: row.tag, severity: 'caution', message, basis: BASIS });
	}
	return flags;
}
