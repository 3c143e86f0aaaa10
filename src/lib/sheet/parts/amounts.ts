import { readPressure, type Pascal, type Reading, type UnitSystem } from '$lib/engine';
import { NUMBER, SIGNED_NUMBER } from './number-pattern';
import { wordedFigures } from './worded-figures';

/** The figures of one part, taken out of its text. */
export interface Amounts {
	readonly count: number;
	readonly coefficient: number | null;
	/** Pa; refused where it is not believable. */
	readonly pressure: Reading<Pascal> | null;
	readonly exponent: number | null;
	readonly parameters: Readonly<Record<string, number | string>>;
	/** Author of the method, as typed behind `by`. */
	readonly author: string | null;
	/** What stood in brackets and is no figure. */
	readonly note: string | null;
	readonly toBeConfirmed: boolean;
	/** How a figure was read that is another one elsewhere; null where there is no doubt. */
	readonly doubt: string | null;
	/** What is left: words and tags. */
	readonly rest: string;
}

const DECIMAL = '(\\d*[.,]\\d+)';
const START = '(?<![a-z0-9])';

const COEFFICIENT = new RegExp(`${START}(?:c|zeta|ζ) ?[=:]? ?${SIGNED_NUMBER}(?![\\d.,]*\\d)`);
// A lone inch mark is a pressure only behind a decimal figure below three: `12" damper` and `grille 5.5"` tell a size.
const PRESSURE = new RegExp(
	`(?:(?<![^ ])-)?${NUMBER} ?` +
		/(?:k?pa\b|(?:in\.?|inch|")? ?w\.?[gc]\.?(?![a-z])|iwg\b|iwc\b|mm ?(?:w\.?[gc]\.?|h2o)|(?:in\.?|") ?h2o)/.source +
		/|(?<![\d.,])[0-2]?[.,]\d+ ?(?:in\b\.?|")/.source
);
const PARAMETERS: readonly (readonly [string, RegExp])[] = [
	['radiusRatio', new RegExp(`${START}r(?: ?/ ?[dwh])? ?=? ?${SIGNED_NUMBER}`)],
	['pieces', /(?<![\d.,])(\d+)[ -]?(?=(?:pieces?|pc|gores?|segments?)\b)/],
	['angle', new RegExp(`${SIGNED_NUMBER} ?(?:°|deg(?:rees?)?\\b)`)],
	['areaRatio', new RegExp(`${START}(?:area ratio|a) ?=? ?${DECIMAL}`)],
	['freeArea', new RegExp(`${START}(?:free area|f) ?=? ?${DECIMAL}`)],
	['vanes', /(?<![\d.,])([123])[ -]?(?=(?:splitters?|splitter vanes?)\b)/],
	['thicknessRatio', new RegExp(`${START}t ?=? ?${DECIMAL}`)],
	['lengthRatio', new RegExp(`${START}l ?=? ?${DECIMAL}`)]
];
const EXPONENT = new RegExp(`${START}n ?=? ?${DECIMAL}`);
/** Beside a pressure; else it could be a tag. */
const WHOLE_EXPONENT = new RegExp(`${START}n ?=? ?([0-9])(?![\\w.,-])`);
const AUTHOR = /\bby ([a-z]+(?:[ -](?:table|equation))?)(?![a-z])/;
const PLANE = /\bplane ?=? ?(width|height|w|h)\b/;
/** Angles that people write before an elbow without the sign. */
const BARE_ANGLE = /^(15|22[.,]5|30|45|60|75|90)(?= |$)(?! ?x)/;
const COUNT = /^(\d{1,4})(?: ?[x*] ?| (?=\d)| ?(?=[a-z]))/;
const COUNT_AFTER = / ?[x*] ?(\d{1,4})$/;

/** A figure with a point or a comma. */
function figure(text: string): number {
	return Number(text.replace(',', '.'));
}

function doubtOf(pressure: Reading<Pascal> | null): string | null {
	if (!pressure?.ok || pressure.other === null) return null;
	return `${pressure.why ?? 'it could be another figure'}; or is it ${pressure.other}`;
}

/** A coefficient is hardly ever above a thousand; who groups by commas is told. */
function commaDoubt(coefficient: string | null): string | null {
	if (coefficient === null || !/^-?[1-9]\d{0,2},\d{3}$/.test(coefficient)) return null;
	return `the comma in “${coefficient}” is read as the decimal point`;
}

/** Takes count, coefficient, pressure, parameters and the question mark out of the plain text of one part. */
export function takeAmounts(plain: string, units: UnitSystem): Amounts {
	let rest = plain;
	const take = (pattern: RegExp): string | null => {
		const found = pattern.exec(rest);
		if (!found) return null;
		rest = `${rest.slice(0, found.index)} ${rest.slice(found.index + found[0].length)}`.replace(/ +/g, ' ').trim();
		return found[1] ?? found[0];
	};
	const toBeConfirmed = take(/\?+/) !== null;
	const coefficient = take(COEFFICIENT);
	const pressureText = take(PRESSURE);
	const pressure = pressureText === null ? null : readPressure(pressureText, units);
	const parameters = wordedFigures(rest, take);
	for (const [name, pattern] of PARAMETERS) {
		const typed = take(pattern);
		if (typed !== null) parameters[name] = figure(typed);
	}
	const plane = take(PLANE);
	if (plane !== null) parameters['plane'] = plane.startsWith('w') ? 'width' : 'height';
	const exponent = take(EXPONENT) ?? (pressure === null ? null : take(WHOLE_EXPONENT));
	rest = rest
		.replace(/\(\s*\)/g, ' ')
		.replace(/\( *([bs]) *\)/g, ' $1 ')
		.replace(/ +/g, ' ')
		.trim();
	const note = take(/\(([^()]*)\)/);
	const author = take(AUTHOR);
	const bareAngle = take(BARE_ANGLE);
	const count = bareAngle === null ? (take(COUNT) ?? take(COUNT_AFTER)) : null;
	const angle = bareAngle ?? take(BARE_ANGLE);
	if (angle !== null && parameters['angle'] === undefined) parameters['angle'] = figure(angle);
	return {
		count: count === null ? 1 : Number(count),
		coefficient: coefficient === null ? null : figure(coefficient),
		pressure,
		exponent: exponent === null ? null : figure(exponent),
		parameters,
		author,
		note: note === null || note.trim() === '' ? null : note.trim(),
		toBeConfirmed,
		doubt: doubtOf(pressure) ?? commaDoubt(coefficient),
		rest
	};
}
