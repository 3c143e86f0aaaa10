import { quoted, refusal, type Picture, type UnitSystem } from '$lib/engine';
import { takeAmounts, type Amounts } from './amounts';
import { entryByName, isNameWord } from './by-name';
import { findWord, nearestWords, type Role, type Word } from './lexicon';
import type { PartEquipment, PartFitting, PartWord } from './parts';
import { takesOf } from './takes';

export type PartReading =
	| { readonly ok: true; readonly slot: 'junction' | 'fitting'; readonly part: PartFitting }
	| { readonly ok: true; readonly slot: 'equipment'; readonly part: PartEquipment; readonly count: number }
	| { readonly ok: false; readonly message: string; readonly expected: string };

const TAG = /^[a-z]{1,4}-?\d{1,4}[a-z]?$/;
const MOST = { fittings: 1000, equipment: 50, coefficient: 1_000_000 } as const;

/** Reads one part: `[count x] words [r1.5] [45°] [C0.23] [25 Pa] [?]`, in any order. Never throws. */
export function readPart(typed: string, units: UnitSystem): PartReading {
	const amounts = takeAmounts(typed.toLowerCase(), units);
	const ofCatalogue = amounts.coefficient === null && amounts.pressure === null ? entryByName(amounts.rest) : null;
	if (ofCatalogue && !isCommon(ofCatalogue.entry.key)) return fromName(typed, amounts, ofCatalogue);
	const known: Word[] = [];
	const tags: string[] = [];
	for (const written of amounts.rest.split(/ +|(?=\+)|(?<=\+)/)) {
		const bare = written.replace(/^[.:]+|[.:]+$/g, '');
		const word = findWord(bare);
		if (word) known.push(word);
		else if (TAG.test(bare)) tags.push(bare.toUpperCase());
		else if (isNameWord(bare)) known.push({ role: 'plain', print: bare, picture: null });
		else if (bare !== '' && bare !== '-') return unknownWord(written);
	}
	const roles = new Set(known.map((word) => word.role));
	if (known.length === 0 && amounts.parameters['angle'] !== undefined) roles.add('elbow');
	if (known.length === 0 && amounts.parameters['radiusRatio'] !== undefined) roles.add('elbow');
	return assembled(typed, units, amounts, roles, nameOf(known, tags, roles, amounts.note), pictureOf(known, roles));
}

/** Those that the words of the trade name already, with what a row's shape makes of them. */
const COMMON =
	/elbow-(smooth|mitred|segmented|vaned|splitter)$|^(sudden|gradual)-|^entry-(flush|plain-end|projecting|bellmouth)|^exit-|^damper-(butterfly|parallel|opposed)/;
const isCommon = (key: string) => COMMON.test(key) && !key.startsWith('oval');

function fromName(
	typed: string,
	amounts: Amounts,
	{ entry, word }: NonNullable<ReturnType<typeof entryByName>>
): PartReading {
	const { count, parameters, toBeConfirmed } = amounts;
	if (count < 1) return { ok: false, message: refusal(typed, 'a count is 1 or more'), expected: exampleOf(word) };
	if (count > MOST.fittings)
		return { ok: false, message: refusal(typed, 'the count is too great'), expected: `at most ${MOST.fittings}` };
	const { key, name, picture } = entry;
	return { ok: true, slot: 'fitting', part: { word, kind: key, count, name, parameters, picture, toBeConfirmed } };
}

function unknownWord(typed: string): PartReading {
	if (/^\d*[.,]?\d+$/.test(typed))
		return {
			ok: false,
			message: `${quoted(typed)} is a figure without a sign.`,
			expected: `${typed} Pa for a pressure, or C${typed} for a coefficient`
		};
	if (/\d/.test(typed))
		return { ok: false, message: `${quoted(typed)} is not understood.`, expected: exampleOf('elbow') };
	const message = `${quoted(typed)} is not a known part.`;
	return { ok: false, message, expected: `known words nearest to it: ${nearestWords(typed).join(', ')}` };
}

function assembled(
	typed: string,
	units: UnitSystem,
	amounts: Amounts,
	roles: ReadonlySet<Role>,
	name: string,
	picture: Picture
): PartReading {
	const refuse = (message: string, expected: string): PartReading => ({
		ok: false,
		message: refusal(typed, message),
		expected
	});
	const { coefficient, pressure, count, parameters, toBeConfirmed } = amounts;
	const word = wordOf(roles);
	if (word === null) return refuse('no word says what it is', 'a word such as elbow, damper or silencer');
	if (coefficient !== null && pressure !== null)
		return refuse('has both a coefficient and a pressure', 'one of the two');
	if (count < 1) return refuse('a count is 1 or more', exampleOf(word));
	if (coefficient !== null && Math.abs(coefficient) > MOST.coefficient)
		return refuse('the coefficient is too great', `at most ${MOST.coefficient}, such as C0.23`);
	if (word === 'junction') {
		if (count > 1) return refuse('a row has one junction, at its fan end', 'the junction without a count');
		if (pressure !== null)
			return refuse('a junction has a coefficient, not a pressure', 'tee branch, or tee branch C0.8');
		if (coefficient !== null) return { ok: true, slot: 'junction', part: fitting('fixed') };
		const kind = junctionKind(roles, parameters['angle']);
		const leg = roles.has('straight') ? 'straight' : roles.has('leg') || isTakeOff(roles) ? 'branch' : null;
		if (leg === null) return lacking(word);
		const { angle, ...rest } = parameters;
		const asked = angle === undefined || kind === 'tee' ? rest : { ...rest, angle };
		return { ok: true, slot: 'junction', part: { ...fitting(kind), parameters: { ...asked, leg } } };
	}
	if (pressure !== null) {
		// The figure alone is named by its own reading; here the part is.
		if (!pressure.ok) return refuse(pressure.message.replace(/^“[^”]*”: /, ''), pressure.expected);
		if (count > MOST.equipment) return refuse('the count is too great', `at most ${MOST.equipment}`);
		if (amounts.exponent !== null && amounts.exponent > 4) return refuse('the exponent is too great', 'at most 4');
		const part = { name, loss: pressure.value, exponent: amounts.exponent ?? 2, picture, toBeConfirmed };
		return { ok: true, slot: 'equipment', part, count };
	}
	if (count > MOST.fittings) return refuse('the count is too great', `at most ${MOST.fittings}`);
	if (coefficient !== null) return { ok: true, slot: 'fitting', part: fitting('fixed') };
	const kind = kindOf(word, roles);
	return kind === null ? lacking(word) : { ok: true, slot: 'fitting', part: fitting(kind) };

	function lacking(what: PartWord): PartReading {
		const { message, expected } = takesOf(what, amounts.rest, units);
		return refuse(message, expected);
	}

	function fitting(kind: string): PartFitting {
		const leg = roles.has('smaller') ? 'smaller' : roles.has('larger') ? 'larger' : null;
		const base: PartFitting = {
			word: word as PartWord,
			kind,
			count,
			name,
			parameters: leg === null ? parameters : { ...parameters, leg },
			picture,
			toBeConfirmed
		};
		return coefficient === null ? base : { ...base, coefficient };
	}
}

const JUNCTIONS: readonly Role[] = ['junction', 'shoe', 'take-off', 'wye', 'cross', 'bullhead'];
const BESIDE_A_LEG: readonly Role[] = ['leg', 'straight', 'plain', 'transition', 'chamber'];

/** A junction takes what is named beside it; `branch` and `straight` alone are one, `branch damper` is a damper. */
function wordOf(roles: ReadonlySet<Role>): PartWord | null {
	if (JUNCTIONS.some((role) => roles.has(role))) return 'junction';
	const legAlone = [...roles].every((role) => BESIDE_A_LEG.includes(role));
	if ((roles.has('leg') || roles.has('straight') || roles.has('chamber')) && legAlone) return 'junction';
	if (roles.has('special-damper')) return 'device';
	if (roles.has('damper') || roles.has('butterfly')) return 'damper';
	if (roles.has('elbow')) return 'elbow';
	if (roles.has('transition') || roles.has('expansion') || roles.has('contraction')) return 'transition';
	if (roles.has('entry') || roles.has('bellmouth')) return 'entry';
	if (roles.has('exit')) return 'exit';
	if (roles.has('device')) return 'device';
	return roles.has('mitred') || roles.has('vaned') ? 'elbow' : null;
}

/** Key of the junction in the catalogue: a tee at another angle than 90° is a wye. */
function junctionKind(roles: ReadonlySet<Role>, angle: number | string | undefined): string {
	if (roles.has('bullhead')) return 'bullhead-tee';
	if (roles.has('cross')) return 'cross';
	if (roles.has('gradual') && (roles.has('take-off') || roles.has('junction'))) return 'conical-take-off';
	if (roles.has('shoe')) return 'shoe-take-off';
	if (roles.has('chamber')) return 'plenum';
	return roles.has('wye') || (angle !== undefined && angle !== 90) ? 'wye' : 'tee';
}

/** What only ever is the branch: a take-off, a leg of a bullhead tee, a duct that leaves a plenum. */
const isTakeOff = (roles: ReadonlySet<Role>) =>
	(['shoe', 'take-off', 'bullhead', 'chamber'] as const).some((role) => roles.has(role));

/** Kind of the catalogue without its shape, or null where only a coefficient or a pressure can tell. */
function kindOf(word: PartWord, roles: ReadonlySet<Role>): string | null {
	if (word === 'elbow') {
		if (roles.has('vaned')) return 'elbow-vaned';
		if (roles.has('mitred')) return 'elbow-mitred';
		if (roles.has('segmented')) return 'elbow-segmented';
		return roles.has('splitter') ? 'elbow-splitter' : 'elbow-smooth';
	}
	if (word === 'damper') {
		if (roles.has('opposed')) return 'damper-opposed-blades';
		if (roles.has('parallel')) return 'damper-parallel-blades';
		return roles.has('butterfly') ? 'damper-butterfly' : 'damper';
	}
	if (word === 'entry') {
		if (roles.has('bellmouth')) return roles.has('in-wall') ? 'entry-bellmouth-in-wall' : 'entry-bellmouth';
		if (roles.has('projecting')) return 'entry-projecting';
		if (roles.has('flush')) return 'entry-flush';
		return roles.has('plain-end') ? 'entry-plain-end' : null;
	}
	if (word === 'exit') return roles.has('device') ? 'exit-diffuser' : 'exit-plain';
	if (word === 'transition') {
		const change = roles.has('expansion') ? 'expansion' : roles.has('contraction') ? 'contraction' : null;
		if (change !== null && roles.has('sudden')) return `sudden-${change}`;
		return change !== null && roles.has('gradual') ? `gradual-${change}` : null;
	}
	return null;
}

function exampleOf(word: PartWord): string {
	return word === 'elbow'
		? 'a part, such as 2 x elbow r1.0 or elbow C0.23'
		: 'a part, such as damper C0.2 or silencer 25 Pa';
}

function nameOf(
	known: readonly Word[],
	tags: readonly string[],
	roles: ReadonlySet<Role>,
	note: string | null
): string {
	const printed = known.map((word) => word.print).filter((print) => print !== '');
	if (printed.length === 0 && roles.has('elbow')) printed.push('elbow');
	const name = [...printed, ...tags].join(' ');
	const capital = name.startsWith('ahu') ? `AHU${name.slice(3)}` : name.charAt(0).toUpperCase() + name.slice(1);
	return note === null ? capital : `${capital} (${note})`;
}

/** The picture of the word that names the part: the last of its kind, a fire damper before a damper. */
function pictureOf(known: readonly Word[], roles: ReadonlySet<Role>): Picture {
	const word = wordOf(roles);
	const own = known.filter(
		(entry) =>
			entry.picture !== null &&
			(word === 'device' ||
				entry.role === word ||
				(word === 'junction' && (JUNCTIONS.includes(entry.role) || entry.role === 'leg' || entry.role === 'straight')))
	);
	const special = known.find((entry) => entry.role === 'special-damper');
	const shaped = own.find((entry) => entry.picture === 'shoe' || entry.picture === 'wye');
	const device = word === 'device' ? own.find((entry) => entry.role === 'device') : undefined;
	const fallback: Picture = word === 'elbow' ? 'elbow' : word === 'damper' ? 'damper' : 'transition';
	return (special ?? shaped ?? device ?? own[0])?.picture ?? fallback;
}
