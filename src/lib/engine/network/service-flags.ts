import type { DesignDocument, DesignRow, Flag, Service } from '../document/types';

const CAUTIONS: Readonly<Record<Exclude<Service, 'general'>, string>> = {
	'kitchen-grease':
		'Kitchen grease exhaust: construction, clearance, cleaning access, velocity and fire protection follow codes that are not checked here.',
	laboratory: 'Laboratory or fume-hood exhaust: containment, materials, dilution and discharge are not checked here.',
	hazardous: 'Hazardous, dusty or explosive exhaust: transport velocity, materials and ignition are not checked here.',
	'smoke-control':
		'Smoke control: leakage, temperature, reliability and the sequence of operation are not checked here.'
};

type Hint = Exclude<Service, 'general'> | null;

/** Words that hint at a service nobody has named. */
const HINTS: readonly (readonly [RegExp, Exclude<Service, 'general'>])[] = [
	[/\b(kitchens?|grease|cooking|cookers?|fryers?|canop(y|ies)|range hoods?)\b/i, 'kitchen-grease'],
	[/\b(laborator(y|ies)|labs?|fume (hoods?|cupboards?)|fumes?|isolation)\b/i, 'laboratory'],
	[/\b(hazardous|explosive|dusts?|welding|flues?|boilers?|combustion)\b/i, 'hazardous'],
	[/\b(smoke (control|exhaust|extract)|(stairs?|lift|lobby) pressuri[sz]ation|pressuri[sz]ation)\b/i, 'smoke-control']
];
/** Most texts hint at nothing: one look tells. */
const ANY = new RegExp(HINTS.map(([pattern]) => pattern.source).join('|'), 'i');
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
	const inTitle = hintOf(document.title ?? '');
	if (inTitle !== null) flags.push(hinted(null, inTitle));
	const known = new Map<string, Hint>();
	/** Parts have few distinct names. */
	const ofPart = (name: string): Hint => {
		let hint = known.get(name);
		if (hint === undefined) known.set(name, (hint = hintOf(name)));
		return hint;
	};
	for (const row of document.rows) {
		const hint = hintIn(row, ofPart);
		if (hint !== null) flags.push(hinted(row.tag, hint));
	}
	return flags;
}

/** The first hint among the texts of a row that may name what it serves. */
function hintIn({ serves, outlet, equipment, fittings }: DesignRow, ofPart: (name: string) => Hint): Hint {
	let hint: Hint = serves === undefined ? null : hintOf(serves);
	if (outlet?.name !== undefined) hint ??= hintOf(outlet.name);
	if (equipment) for (const { name } of equipment) hint ??= ofPart(name);
	if (fittings) for (const { name } of fittings) if (name !== undefined) hint ??= ofPart(name);
	return hint;
}

function hintOf(text: string): Hint {
	if (!ANY.test(text)) return null;
	return HINTS.find(([pattern]) => pattern.test(text))?.[1] ?? null;
}

function hinted(row: string | null, service: Exclude<Service, 'general'>): Flag {
	const message = `${CAUTIONS[service]} Name the service of the design to settle this.`;
	return { rule: 'service-caution', row, severity: 'caution', message, basis: BASIS };
}
