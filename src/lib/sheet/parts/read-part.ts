import { fittingEntry, quoted, refusal, type Picture, type UnitSystem } from '$lib/engine';
import { takeAmounts, type Amounts } from './amounts';
import { AUTHORS, methodKeyOf } from './authors';
import { entryByName, isNameWord, type NamedPart } from './by-name';
import { findWord, nearestWords, type Role, type Word } from './lexicon';
import type { PartEquipment, PartFitting, PartWord } from './parts';
import { bladesOf, isTakeOff, junctionKind, kindOf, nameOf, pictureOf, wordOf } from './kind-of-part';
import { notOnePart } from './not-one-part';
import { UNCLEAR } from './phrases';
import { takesOf } from './takes';

export type PartReading =
	| { readonly ok: true; readonly slot: 'junction' | 'fitting'; readonly part: PartFitting; readonly doubt?: string }
	| {
			readonly ok: true;
			readonly slot: 'equipment';
			readonly part: PartEquipment;
			readonly count: number;
			readonly doubt?: string;
	  }
	| { readonly ok: false; readonly message: string; readonly expected: string };

const TAG = /^[a-z]{1,4}-?\d{1,4}[a-z]?$/;
const MOST = { fittings: 1000, equipment: 50, coefficient: 1_000_000 } as const;

/** Reads one part, and says where a figure of it could be another one. Never throws. */
export function readPart(typed: string, units: UnitSystem): PartReading {
	const amounts = takeAmounts(typed.toLowerCase(), units);
	const reading = readAmounts(typed, units, amounts);
	return reading.ok && amounts.doubt !== null ? { ...reading, doubt: amounts.doubt } : reading;
}

/** Reads one part: `[count x] words [r1.5] [45°] [C0.23] [25 Pa] [by author] [?]`, in any order. */
function readAmounts(typed: string, units: UnitSystem, amounts: Amounts): PartReading {
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
	const method = amounts.author === null ? null : methodKeyOf(amounts.author);
	const fault = authorFault(amounts, method);
	if (fault) return { ok: false, message: refusal(typed, fault[0]), expected: fault[1] };
	const roles = new Set(known.map((word) => word.role));
	if (known.length === 0 && amounts.parameters['angle'] !== undefined) roles.add('elbow');
	if (known.length === 0 && amounts.parameters['radiusRatio'] !== undefined) roles.add('elbow');
	const more = notOnePart(typed.toLowerCase(), tags, roles);
	if (more) return { ok: false, message: refusal(typed, more[0]), expected: more[1] };
	const name = nameOf(known, tags, roles, amounts.note);
	const named = entryByName(amounts.rest, roleOf);
	if (named && isNamed(named, amounts)) return fromName(typed, amounts, named, name, roles, method);
	const own = wordOf(roles);
	const picture = own === null && named ? named.picture : pictureOf(known, roles);
	return assembled(typed, units, amounts, roles, name, picture, method, own ?? named?.word ?? null);
}

const roleOf = (word: string) => findWord(word)?.role ?? null;

/** A method goes with the catalogue, not with a figure of one's own. */
function authorFault(amounts: Amounts, method: string | null): readonly [string, string] | null {
	if (amounts.author === null) return null;
	if (method === null) return [`the catalogue has no method by ${amounts.author}`, `one of ${AUTHORS}`];
	if (amounts.coefficient === null && amounts.pressure === null) return null;
	return ['has a figure of its own beside a method', 'one of the two'];
}

/** Those that the words of the trade name already, with what a row's shape makes of them. */
const COMMON =
	/elbow-(smooth|mitred|segmented|vaned|splitter)$|^(sudden|gradual)-(?!tr)|^entry-(flush|plain-end|projecting|bellmouth)|^exit-|^damper-(butterfly|parallel|opposed)/;
const isCommon = (key: string) => COMMON.test(key) && !key.startsWith('oval');

/** With a figure typed beside it a part stands for itself, unless it is one to which its maker's is entered. */
function isNamed({ kind }: NamedPart, { coefficient, pressure, rest }: Amounts): boolean {
	if (isCommon(kind) || pressure !== null) return false;
	if (coefficient === null) return true;
	return isByMaker(kind) && !isUnclear(kind, rest);
}

const isByMaker = (kind: string) => (fittingEntry(kind)?.parameters ?? []).some(({ name }) => name === 'coefficient');
const isUnclear = (kind: string, rest: string) => kind === UNCLEAR && !/cowl|discharge/.test(rest);

function fromName(
	typed: string,
	amounts: Amounts,
	{ kind: named, word, picture }: NamedPart,
	name: string,
	roles: ReadonlySet<Role>,
	method: string | null
): PartReading {
	const { count, coefficient, toBeConfirmed, rest } = amounts;
	const refuse = (message: string, expected: string): PartReading => ({
		ok: false,
		message: refusal(typed, message),
		expected
	});
	if (count < 1) return refuse('a count is 1 or more', exampleOf(word));
	if (count > MOST.fittings) return refuse('the count is too great', `at most ${MOST.fittings}`);
	if (isUnclear(named, rest))
		return refuse(
			'does a hood take the air in or let it out',
			'hood, flanged hood or tapered hood 45° where it takes air in; exhaust cowl C1.2 where it lets it out'
		);
	if (coefficient === null && isByMaker(named)) return refuse(...makersOf(named, rest));
	const leg = legOf(roles);
	const parameters: PartFitting['parameters'] = {
		...amounts.parameters,
		...(coefficient !== null && { coefficient }),
		...(leg !== null && { leg })
	};
	const isThick = named === 'perforated-plate' && parameters['thicknessRatio'] !== undefined;
	const kind = named === 'perforated-plate' ? `perforated-plate-${isThick ? 'thick' : 'thin'}` : named;
	const by = method === null ? {} : { method };
	return { ok: true, slot: 'fitting', part: { word, kind, count, name, parameters, ...by, picture, toBeConfirmed } };
}

function makersOf(kind: string, typed: string): readonly [string, string] {
	return kind.startsWith('fan')
		? ['its coefficient is missing: K of the charts, or of the maker of the fan', `${typed} C0.3`]
		: ['its coefficient or its pressure is missing: what the maker states', `${typed} C1.2, or ${typed} 25 Pa`];
}

const legOf = (roles: ReadonlySet<Role>) => (roles.has('smaller') ? 'smaller' : roles.has('larger') ? 'larger' : null);

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
	picture: Picture,
	method: string | null,
	word: PartWord | null
): PartReading {
	const refuse = (message: string, expected: string): PartReading => ({
		ok: false,
		message: refusal(typed, message),
		expected
	});
	const { coefficient, pressure, count, parameters, toBeConfirmed } = amounts;
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
	if (kind === null) return lacking(word);
	const blades = bladesOf(kind, parameters);
	if (blades === null) return { ok: true, slot: 'fitting', part: fitting(kind) };
	const open = fitting('damper-blades-open');
	return { ok: true, slot: 'fitting', part: { ...open, parameters: { ...open.parameters, blades } } };

	function lacking(what: PartWord): PartReading {
		const { message, expected } = takesOf(what, amounts.rest, units);
		return refuse(message, expected);
	}

	function fitting(kind: string): PartFitting {
		const leg = legOf(roles);
		const base: PartFitting = {
			word: word as PartWord,
			kind,
			count,
			name,
			parameters: leg === null ? parameters : { ...parameters, leg },
			...(method !== null && { method }),
			picture: fittingEntry(kind)?.picture ?? picture,
			toBeConfirmed
		};
		return coefficient === null ? base : { ...base, coefficient };
	}
}

function exampleOf(word: PartWord): string {
	return word === 'elbow'
		? 'a part, such as 2 x elbow r1.0 or elbow C0.23'
		: 'a part, such as damper C0.2 or silencer 25 Pa';
}
