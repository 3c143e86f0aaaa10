import { basis, flagged, foundOf, hasNamed, notApplicable, PASS, PRACTICE } from './found';
import { isDamper } from './shapes';
import type { CheckDefinition } from './types';

const FIRE = /\b(fire|smoke|fsd|fd|sd)\b/i;

export const airChecks: readonly CheckDefinition[] = [
	{
		key: 'density-of-equipment',
		title: 'Losses of equipment suit the density',
		looksAt: 'density of the air against that of makers’ data',
		severity: 'note',
		threshold: null,
		basis: PRACTICE('a loss grows in proportion to the density'),
		test: (context) => flagged(context, 'losses-as-entered')
	},
	{
		key: 'elevation',
		title: 'Elevation is in the density',
		looksAt: 'elevation of the site; the schedule states the density',
		severity: 'note',
		threshold: { default: 500, unit: 'm', label: 'Elevation without a word, at most' },
		basis: basis('from memory', 'corrected above some 1,500 to 2,000 ft'),
		test: ({ document }, most) => {
			if ('density' in document.air) return notApplicable('The air is given by its density.');
			const elevation = document.air.elevation ?? 0;
			return elevation <= most
				? PASS
				: foundOf([
						{
							row: null,
							value: elevation,
							message: 'The site lies high: state the density and the elevation on the schedule.'
						}
					]);
		}
	},
	{
		key: 'temperature-near-standard',
		title: 'Temperature is near the standard one',
		looksAt: 'temperature of the air against 20 °C',
		severity: 'note',
		threshold: { default: 15, unit: 'K', label: 'From 20 °C without a word, at most' },
		basis: basis('from memory', 'corrected beyond some 15 K off standard'),
		test: ({ document, rows }, most) => {
			if ('density' in document.air) return notApplicable('The air is given by its density.');
			const general = document.air.temperature;
			const off = rows.flatMap(([{ tag }, { temperature }]) =>
				temperature !== undefined && Math.abs(temperature - 20) > most ? [{ row: tag, value: temperature }] : []
			);
			const all = Math.abs(general - 20) > most ? [{ row: null, value: general }, ...off] : off;
			return foundOf(
				all.map((one) => ({ ...one, message: 'The air is far from 20 °C: state its density on the schedule.' }))
			);
		}
	},
	{
		key: 'streams-mix',
		title: 'United streams have their mixed temperature',
		looksAt: 'temperatures where streams unite',
		severity: 'caution',
		threshold: null,
		basis: PRACTICE('balance of heat by mass'),
		test: (context) => flagged(context, 'temperature-mix')
	},
	{
		key: 'no-condensation',
		title: 'No air is below its dew point',
		looksAt: 'rows colder than the dew point of the design’s air',
		severity: 'caution',
		threshold: null,
		basis: PRACTICE('saturation pressure'),
		test: (context) => flagged(context, 'condensation')
	},
	{
		key: 'service-named',
		title: 'Special services are heeded',
		looksAt: 'service of the design and names of its rooms',
		severity: 'caution',
		threshold: null,
		basis: basis('standard', 'local codes and licensed practice come first'),
		test: (context) => flagged(context, 'service-caution')
	},
	{
		key: 'fire-dampers',
		title: 'Fire and smoke dampers',
		looksAt: 'dampers named as such: only their pressure drop is counted',
		severity: 'note',
		threshold: null,
		basis: basis('standard', 'outside the scope of a pressure calculation; the codes place and rate them'),
		test: (context) => flagged(context, 'fire-damper-caution')
	},
	{
		key: 'no-damper-in-hood-exhaust',
		title: 'No fire damper in fume-hood exhaust',
		looksAt: 'fire and smoke dampers in laboratory exhaust',
		severity: 'fault',
		threshold: null,
		basis: basis('standard', 'laboratory fire codes (NFPA 45), as practice quotes them'),
		test: ({ document, rows }) =>
			document.service !== 'laboratory'
				? notApplicable('The service is no laboratory exhaust.')
				: foundOf(
						rows.flatMap(([row]) =>
							row.side === 'exhaust' && hasNamed(row, FIRE)
								? [{ row: row.tag, message: 'A fire or smoke damper stands in laboratory exhaust.' }]
								: []
						)
					)
	},
	{
		key: 'grease-velocity',
		title: 'Velocity in grease ducts',
		looksAt: 'velocity of kitchen grease exhaust',
		severity: 'fault',
		threshold: { default: 2.54, unit: 'm/s', label: 'Velocity, at least' },
		basis: basis('standard', 'mechanical codes for grease ducts: 500 fpm, formerly 1,500; the local code governs'),
		test: ({ document, rows }, least) =>
			document.service !== 'kitchen-grease'
				? notApplicable('The service is no kitchen grease exhaust.')
				: foundOf(
						rows.flatMap(([{ tag, side }, { velocity }]) =>
							side === 'exhaust' && velocity < least
								? [{ row: tag, value: velocity, message: 'Grease settles at so low a velocity.' }]
								: []
						)
					)
	},
	{
		key: 'grease-dampers',
		title: 'No dampers in grease ducts',
		looksAt: 'dampers in kitchen grease exhaust',
		severity: 'fault',
		threshold: null,
		basis: basis('standard', 'mechanical codes for grease ducts; the local code governs'),
		test: ({ document, rows }) =>
			document.service !== 'kitchen-grease'
				? notApplicable('The service is no kitchen grease exhaust.')
				: foundOf(
						rows.flatMap(([row]) =>
							row.side === 'exhaust' && (hasNamed(row, /damper/i) || row.fittings?.some(({ kind }) => isDamper(kind)))
								? [{ row: row.tag, message: 'A damper stands in a grease duct.' }]
								: []
						)
					)
	}
];
