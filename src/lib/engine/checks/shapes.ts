import { fittingEntry } from '../fitting';
import { above, basis, flagged, foundOf, notApplicable, PRACTICE } from './found';
import type { CheckDefinition } from './types';

const MIL = 'MIL-HDBK-1003/3';
const aspect = (size: { shape: string; width?: number; height?: number }) =>
	size.width === undefined || size.height === undefined
		? null
		: Math.max(size.width, size.height) / Math.min(size.width, size.height);

export const shapeChecks: readonly CheckDefinition[] = [
	{
		key: 'aspect-ratio',
		title: 'Aspect ratio',
		looksAt: 'longer side over shorter',
		severity: 'caution',
		threshold: { default: 4, unit: '', label: 'Aspect ratio, at most' },
		basis: basis('from memory', 'many firms flag above 4; MIL-HDBK-1003/3 aims at 3'),
		test: (context, most) =>
			above(context, most, 'The section is flat: it costs sheet metal and pressure.', ({ size }) => aspect(size))
	},
	{
		key: 'aspect-ratio-greatest',
		title: 'Greatest aspect ratio',
		looksAt: 'longer side over shorter',
		severity: 'fault',
		threshold: { default: 6, unit: '', label: 'Aspect ratio, never above' },
		basis: basis('handbook', MIL),
		test: (context, most) =>
			above(context, most, 'The section is flatter than the handbook allows.', ({ size }) => aspect(size))
	},
	{
		key: 'least-round',
		title: 'Least round size',
		looksAt: 'diameter of round ducts',
		severity: 'note',
		threshold: { default: 0.1, unit: 'm', label: 'Diameter, at least' },
		basis: basis('handbook', `${MIL}: 4 in.`),
		test: ({ rows }, least) => {
			const round = rows.flatMap(([{ tag, size }]) => (size.shape === 'round' ? [{ tag, value: size.diameter }] : []));
			if (round.length === 0) return notApplicable('No duct is round.');
			return foundOf(
				round
					.filter(({ value }) => value < least)
					.map(({ tag, value }) => ({ row: tag, value, message: 'The duct is smaller than the least size.' }))
			);
		}
	},
	{
		key: 'least-side',
		title: 'Least side',
		looksAt: 'sides of rectangular ducts',
		severity: 'note',
		threshold: { default: 0.15, unit: 'm', label: 'Side, at least' },
		basis: basis('handbook', `${MIL}: 6 in. by 6 in.; another manual allows 8 by 6`),
		test: ({ rows }, least) => {
			const flat = rows.flatMap(([{ tag, size }]) =>
				size.shape === 'rectangular' ? [{ tag, value: Math.min(size.width, size.height) }] : []
			);
			if (flat.length === 0) return notApplicable('No duct is rectangular.');
			return foundOf(
				flat
					.filter(({ value }) => value < least)
					.map(({ tag, value }) => ({ row: tag, value, message: 'A side is shorter than the least one.' }))
			);
		}
	},
	{
		key: 'throat-radius',
		title: 'Throat radius of bends',
		looksAt: 'radius at the throat over the diameter or the side, of elbows of the catalogue',
		severity: 'caution',
		threshold: { default: 0.75, unit: '', label: 'Throat radius over diameter, at least' },
		basis: basis('handbook', MIL),
		test: ({ rows }, least) => {
			const bends = rows.flatMap(([{ tag }, { items }]) =>
				items.flatMap(({ catalogue, name }) => {
					const radius = catalogue?.parameters.radiusRatio;
					return typeof radius === 'number' && /elbow/i.test(name) ? [{ tag, name, value: radius - 0.5 }] : [];
				})
			);
			if (bends.length === 0) return notApplicable('No elbow of the catalogue has a radius.');
			return foundOf(
				bends
					.filter(({ value }) => value < least - 1e-9)
					.map(({ tag, name, value }) => ({ row: tag, value, message: `${name} is bent short.` }))
			);
		}
	},
	{
		key: 'mitred-without-vanes',
		title: 'Mitred elbows have vanes',
		looksAt: 'mitred elbows of 60° and more without vanes',
		severity: 'caution',
		threshold: null,
		basis: basis('handbook', 'C is about 1.15 mitred without vanes (an LBNL report on elbows)'),
		test: ({ rows }) =>
			foundOf(
				rows.flatMap(([row]) =>
					(row.fittings ?? []).flatMap(({ kind, ...rest }) => {
						if (!kind.endsWith('elbow-mitred')) return [];
						const angle = 'angle' in rest ? Number(rest.angle) : 90;
						return angle < 60 ? [] : [{ row: row.tag, message: 'A mitred elbow stands without vanes.' }];
					})
				)
			)
	},
	{
		key: 'fittings-apart',
		title: 'Fittings stand apart',
		looksAt: 'length of a row over its hydraulic diameter, for each two fittings in it',
		severity: 'note',
		threshold: { default: 5, unit: '', label: 'Hydraulic diameters between fittings, at least' },
		basis: PRACTICE('coefficients are measured with straight duct before and behind'),
		test: ({ rows }, least) => {
			const several = rows.flatMap(([row, solved]) => {
				const count = (row.fittings ?? []).reduce((sum, { count = 1 }) => sum + count, row.junction ? 1 : 0);
				return count < 2 ? [] : [{ tag: row.tag, value: row.length / solved.hydraulicDiameter / (count - 1) }];
			});
			if (several.length === 0) return notApplicable('No row has two fittings.');
			return foundOf(
				several
					.filter(({ value }) => value < least)
					.map(({ tag, value }) => ({
						row: tag,
						value,
						message: 'The fittings stand close: together they lose another sum than each alone.'
					}))
			);
		}
	},
	{
		key: 'coefficients-in-range',
		title: 'Coefficients within the range of their sources',
		looksAt: 'fittings and junctions of the catalogue',
		severity: 'caution',
		threshold: null,
		basis: PRACTICE('range of each source'),
		test: (context) => flagged(context, 'coefficient-range')
	},
	{
		key: 'coefficients-by-hand',
		title: 'Coefficients entered by hand',
		looksAt: 'fittings and junctions whose coefficient was typed: on the row’s own velocity pressure',
		severity: 'note',
		threshold: null,
		basis: basis('handbook', 'the reference velocity of each coefficient is stated'),
		test: ({ rows }) =>
			foundOf(
				rows.flatMap(([{ tag }, { items }]) =>
					items
						.filter(({ part, kind }) => (part === 'fitting' || part === 'junction') && kind === 'fixed')
						.map(({ name, coefficient }) => ({
							row: tag,
							...(coefficient !== null && { value: coefficient }),
							message: `${name} has a coefficient entered by hand, taken on the velocity pressure of its own row.`
						}))
				)
			)
	},
	{
		key: 'junctions-counted',
		title: 'Every junction is counted',
		looksAt: 'rows that join another and name no junction, or name one at the fan',
		severity: 'caution',
		threshold: null,
		basis: PRACTICE('each stream of a junction has its own loss'),
		test: (context) => flagged(context, 'no-junction-loss', 'junction-at-fan')
	},
	{
		key: 'junctions-negative',
		title: 'Streams that gain at a junction',
		looksAt: 'negative coefficients at the design flows',
		severity: 'note',
		threshold: null,
		basis: PRACTICE('real for one stream, paid by the other; it does not hold at other flows'),
		test: ({ rows }) =>
			foundOf(
				rows.flatMap(([{ tag }, { junctionLoss }]) =>
					junctionLoss < 0
						? [{ row: tag, value: junctionLoss, message: 'This stream gains total pressure at its junction.' }]
						: []
				)
			)
	},
	{
		key: 'sections-lose',
		title: 'Sections lose pressure',
		looksAt: 'rows whose loss is below nothing',
		severity: 'caution',
		threshold: null,
		basis: PRACTICE('a stream gains only what another one, or gravity, gives'),
		test: (context) => flagged(context, 'negative-loss', 'rise-exceeds-length')
	}
];

/** Dampers of the catalogue. */
export const isDamper = (kind: string): boolean => fittingEntry(kind)?.family === 'dampers';
