import type { Item } from '../document/types';
import { basis, beyond, flagged, foundOf, notApplicable, practice, whole } from './found';
import { LBL_ELBOWS, MIL_AIR, SMACNA_DESIGN, VA_CEMETERY } from './sources';
import type { Finding } from './finding';
import type { CheckContext, CheckDefinition, Pair } from './types';

/** Splitter vanes are what a short throat is given them for. */
const isBend = ({ kind }: Item) => kind !== null && kind.includes('elbow') && !kind.endsWith('splitter');
const ofKind = ({ rows }: CheckContext, test: (kind: string) => boolean) =>
	rows.flatMap(([row]) => (row.fittings ?? []).flatMap((one) => (test(one.kind) ? [{ row, one }] : [])));
const pieces = ([{ fittings = [], junction }]: Pair) =>
	fittings.reduce((sum, { count = 1 }) => sum + count, junction ? 1 : 0);
/** Numbers that were written as k - 0.5 come back with a last bit. */
const ROUNDING = 1e-9;

export const fittingChecks: readonly CheckDefinition[] = [
	{
		key: 'fittings-entered',
		title: 'Fittings are counted, not guessed',
		looksAt: 'fittings and junctions of the rows',
		severity: 'caution',
		threshold: null,
		basis: basis('handbook', VA_CEMETERY, 'actual take-offs, without any approximation for fittings'),
		test: ({ rows }) =>
			whole(
				rows.every((pair) => pieces(pair) === 0),
				'No row has a fitting or a junction: this is an estimate.'
			)
	},
	{
		key: 'throat-radius',
		title: 'Throat radius of bends',
		looksAt: 'radius at the throat over the diameter or the side, of elbows of the catalogue',
		severity: 'caution',
		threshold: { default: 0.75, unit: '', label: 'Throat radius over diameter, at least' },
		basis: basis('handbook', MIL_AIR, 'at least 0.75 of the diameter: 1.25 to the centre line'),
		test: ({ rows }, least) => {
			const bends: { row: string; value: number; unit: string; message: string }[] = [];
			for (const [{ tag }, { items }] of rows)
				for (const item of items) {
					const radius = item.catalogue?.parameters.radiusRatio;
					if (typeof radius !== 'number' || !isBend(item)) continue;
					bends.push({ row: tag, value: radius - 0.5, unit: '', message: `${item.name} is bent short.` });
				}
			if (bends.length === 0) return notApplicable('No elbow of the catalogue has a radius.');
			return foundOf(bends.filter(({ value }) => value < least - ROUNDING));
		}
	},
	{
		key: 'mitred-without-vanes',
		title: 'Mitred elbows have vanes',
		looksAt: 'angle of mitred elbows without vanes',
		severity: 'caution',
		threshold: { default: 60, unit: '°', label: 'Angle without vanes, below' },
		basis: basis(
			'handbook',
			LBL_ELBOWS,
			'C is about 1.15 mitred without vanes, 0.23 with r/D 1; the angle from which it matters is common practice'
		),
		test: (context, least) => {
			const mitred = ofKind(context, (kind) => kind.endsWith('elbow-mitred'));
			if (mitred.length === 0) return notApplicable('No elbow is mitred without vanes.');
			return foundOf(
				mitred
					.map(({ row, one }) => ({ row: row.tag, value: 'angle' in one ? Number(one.angle) : 90, unit: '°' }))
					.filter(({ value }) => value >= least)
					.map((one) => ({ ...one, message: 'A mitred elbow stands without vanes.' }))
			);
		}
	},
	{
		key: 'vanes-single-thickness',
		title: 'Vanes of single thickness',
		looksAt: 'vanes of double thickness in elbows with sides up to the span that asks for them',
		severity: 'caution',
		threshold: { default: 0.9, unit: 'm', label: 'Longer side from which vanes are double' },
		basis: basis(
			'handbook',
			`${MIL_AIR}; ${LBL_ELBOWS}`,
			'double thickness may lose up to 300 % more; it is needed over a span of some 3 ft'
		),
		test: (context, span) => {
			const vaned = ofKind(context, (kind) => /elbow-vaned/.test(kind));
			if (vaned.length === 0) return notApplicable('No elbow has turning vanes.');
			return foundOf(
				vaned.flatMap(({ row: { tag, size }, one: { kind } }) => {
					const value = size.shape === 'round' ? size.diameter : Math.max(size.width, size.height);
					return kind.endsWith('double') && value <= span
						? [
								{
									row: tag,
									value,
									unit: 'm',
									message: 'The vanes are of double thickness where single ones lose less.'
								}
							]
						: [];
				})
			);
		}
	},
	{
		key: 'fittings-apart',
		title: 'Fittings stand apart',
		looksAt: 'length of a row over its hydraulic diameter, for each two fittings in it',
		severity: 'note',
		threshold: { default: 4, unit: '', label: 'Hydraulic diameters between fittings, at least' },
		basis: basis(
			'handbook',
			SMACNA_DESIGN,
			'elbows and take-offs 4 to 5 diameters apart; coefficients are measured with straight duct before and behind'
		),
		test: ({ rows }, least) =>
			beyond(
				rows,
				{
					...{ least, unit: '', none: 'No row has two fittings.' },
					message: 'The fittings stand close: together they lose another sum than each alone.'
				},
				(row, solved) => {
					const count = pieces([row, solved]);
					return count < 2 ? null : row.length / solved.hydraulicDiameter / (count - 1);
				}
			)
	},
	{
		key: 'coefficients-in-range',
		title: 'Coefficients within the range of their sources',
		looksAt: 'fittings and junctions of the catalogue',
		severity: 'caution',
		threshold: null,
		basis: practice('range of each source'),
		test: (context) => flagged(context, 'coefficient-range')
	},
	{
		key: 'coefficients-by-hand',
		title: 'Coefficients entered by hand',
		looksAt: 'fittings and junctions whose coefficient was typed',
		severity: 'note',
		threshold: null,
		basis: practice('a checker asks where a coefficient comes from and which velocity pressure it is on'),
		test: ({ rows }) => {
			const findings: Finding[] = [];
			let known = false;
			for (const [{ tag }, { items }] of rows)
				for (const { part, name, kind, coefficient } of items) {
					if (part !== 'fitting' && part !== 'junction') continue;
					known = true;
					if (kind !== 'fixed') continue;
					const message = `${name} has a coefficient entered by hand, taken on the velocity pressure of its own row.`;
					findings.push({ row: tag, ...(coefficient !== null && { value: coefficient, unit: '' }), message });
				}
			return known ? foundOf(findings) : notApplicable('No row has a fitting or a junction.');
		}
	},
	{
		key: 'junctions-counted',
		title: 'Every junction is counted',
		looksAt: 'rows that join another and name no junction, or name one at the fan',
		severity: 'caution',
		threshold: null,
		basis: practice('each stream of a junction has its own loss'),
		test: (context) =>
			context.rows.some(([{ joins, junction }]) => joins !== null || junction)
				? flagged(context, 'no-junction-loss', 'junction-at-fan')
				: notApplicable('No row joins another.')
	},
	{
		key: 'junctions-negative',
		title: 'Streams that gain at a junction',
		looksAt: 'negative losses of junctions at the design flows',
		severity: 'note',
		threshold: null,
		basis: practice('real for one stream, paid by the other; it does not hold at other flows'),
		test: ({ rows }) =>
			beyond(
				rows,
				{
					...{ least: 0, unit: 'Pa', none: 'No row has a junction.' },
					message: 'This stream gains total pressure at its junction.'
				},
				({ junction }, { junctionLoss }) => (junction ? junctionLoss : null)
			)
	},
	{
		key: 'sections-lose',
		title: 'Sections lose pressure',
		looksAt: 'rows whose loss of total pressure is below nothing',
		severity: 'caution',
		threshold: null,
		basis: practice('a stream gains only what another one, or gravity, gives'),
		test: (context) => flagged(context, 'negative-loss')
	}
];
