/** Kinds of parts that the sizes and the side of the row decide. */
import { sectionOf, type RowSize } from '$lib/engine';
import type { PartFitting, Parts, RowPlace } from './parts';
import { isTransition, TRANSITIONS, type TransitionKind } from './phrases';

type Parameters = PartFitting['parameters'];
export type Placed =
	| { readonly ok: true; readonly kind: string; readonly parameters: Parameters }
	| { readonly ok: false; readonly message: string; readonly expected: string };

/** Whether parts have to know more of the row than its own size. */
export const asksForPlace = (parts: Parts | null): boolean =>
	parts !== null && parts.fittings.some(({ kind }) => kind === 'cap' || isTransition(kind));

/** Areas that differ by less are one: a size is printed in whole millimetres. */
const SAME = 0.005;

/**
 * The kind of a part in its row: a transition widens or narrows by the free areas of the row and of the one it joins,
 * in the direction of the air; a cap lets in or out by the side.
 *
 * @param ofJunction whether a junction of the catalogue stands between the two rows, so that the size of its leg is unknown
 */
export function placedKind(part: PartFitting, size: RowSize, place: RowPlace | null, ofJunction: boolean): Placed {
	const { kind, parameters } = part;
	if (kind === 'cap') return { ok: true, kind: place?.towardFan ? 'intake-cap' : 'exhaust-cap', parameters };
	if (!isTransition(kind)) return { ok: true, kind, parameters };
	const asks = (message: string): Placed => ({ ok: false, message, expected: asked(kind) });
	if (ofJunction)
		return asks('its coefficient C, or its kind, is missing: the size of the junction’s leg is not on the sheet');
	if (!place?.joined)
		return asks('its coefficient C, or its kind, is missing: no size of a row that it joins is known');
	const [own, joined] = [sectionOf(size).area, sectionOf(place.joined).area];
	const ratio = Math.min(own, joined) / Math.max(own, joined);
	if (1 - ratio < SAME && !kind.includes('-to-')) return asks('this row and the one it joins have the same area');
	const widens = place.towardFan ? joined > own : own > joined;
	return {
		ok: true,
		kind: TRANSITIONS[kind][widens ? 'expansion' : 'contraction'],
		parameters: {
			areaRatio: Number(ratio.toPrecision(12)),
			...parameters,
			leg: own > joined ? 'larger' : 'smaller'
		}
	};
}

const KIND_WORDS: Readonly<Record<TransitionKind, string>> = {
	transition: 'gradual contraction a0.5 20°, or gradual expansion a0.5 20°',
	'sudden-transition': 'sudden contraction a0.5, or sudden expansion a0.5',
	'one-sided-transition': 'one-sided contraction a0.5 15°, or one-sided expansion a0.5 15°',
	'pyramidal-transition': 'pyramidal contraction a0.5 20°, or pyramidal expansion a0.5 20°',
	'rectangular-to-round': 'rectangular to round contraction a0.5, or rectangular to round expansion a0.5',
	'round-to-rectangular': 'round to rectangular contraction a0.5, or round to rectangular expansion a0.5'
};

const asked = (kind: TransitionKind): string => `transition C0.1; or ${KIND_WORDS[kind]}`;
