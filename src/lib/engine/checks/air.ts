import { basis, flagged, notApplicable, practice, whole, foundOf } from './found';
import { STANDARD_DENSITY as STANDARD } from '../network/flows';
import { VA_OLDER } from './sources';
import type { CheckDefinition } from './types';

const BY_DENSITY = 'The air is given by its density.';
const ONE_TEMPERATURE = 'All rows have the temperature of the design.';
const ROOM_TEMPERATURE = 20; // degC

export const airChecks: readonly CheckDefinition[] = [
	{
		key: 'density-of-equipment',
		title: 'Losses of equipment suit the density',
		looksAt: 'density of the air against that of makers’ data',
		severity: 'note',
		threshold: null,
		basis: practice('a loss grows in proportion to the density'),
		test: (context) => flagged(context, 'losses-as-entered')
	},
	{
		key: 'elevation',
		title: 'Elevation is in the density',
		looksAt: 'elevation of the site; the schedule states the density',
		severity: 'note',
		threshold: { default: 500, unit: 'm', label: 'Elevation without a word, at most' },
		basis: basis(
			'from memory',
			VA_OLDER,
			'density ratio and elevation stand on the schedule; corrected above some 1,500 to 2,000 ft'
		),
		test: ({ document }, most) => {
			if ('density' in document.air) return notApplicable(BY_DENSITY);
			const value = document.air.elevation ?? 0;
			return whole(value > most, 'The site lies high: state the density and the elevation on the schedule.', {
				value,
				unit: 'm'
			});
		}
	},
	{
		key: 'temperature-near-standard',
		title: 'Temperature is near the standard one',
		looksAt: `temperature of the air against ${ROOM_TEMPERATURE} °C`,
		severity: 'note',
		threshold: { default: 15, unit: 'K', label: `From ${ROOM_TEMPERATURE} °C without a word, at most` },
		basis: basis('from memory', VA_OLDER, 'corrected beyond some 15 K off standard'),
		test: ({ document, rows }, most) => {
			if ('density' in document.air) return notApplicable(BY_DENSITY);
			const isFar = ({ value }: { value: number }) => Math.abs(value - ROOM_TEMPERATURE) > most;
			const all = [
				{ row: null, value: document.air.temperature },
				...rows.flatMap(([{ tag }, { temperature }]) =>
					temperature === undefined ? [] : [{ row: tag, value: temperature }]
				)
			];
			const message = `The air is far from ${ROOM_TEMPERATURE} °C: state its density on the schedule.`;
			return foundOf(all.filter(isFar).map((one) => ({ ...one, unit: 'degC', message })));
		}
	},
	{
		key: 'flow-basis-stated',
		title: 'Flows say actual or standard',
		looksAt: 'basis of the flows of a design that is not of standard air',
		severity: 'note',
		threshold: { default: 0.05, unit: '', label: 'Density from 1.204 kg/m³ without a word, at most' },
		basis: practice('actual flow for velocity and loss, standard flow for heat: the schedule says which'),
		test: ({ document: { flowBasis, standardDensity = STANDARD }, solution }, most) => {
			const value = Math.abs(solution.air.density / standardDensity - 1);
			if (value <= most) return notApplicable('The air is of the standard density: both are one.');
			return whole(flowBasis === undefined, 'The design does not say whether its flows are actual or standard.', {
				value,
				unit: ''
			});
		}
	},
	{
		key: 'streams-mix',
		title: 'United streams have their mixed temperature',
		looksAt: 'temperatures where streams unite',
		severity: 'caution',
		threshold: null,
		basis: practice('balance of heat by mass'),
		test: (context) =>
			context.rows.some(([{ temperature }]) => temperature !== undefined)
				? flagged(context, 'temperature-mix')
				: notApplicable(ONE_TEMPERATURE)
	},
	{
		key: 'no-condensation',
		title: 'No air is below its dew point',
		looksAt: 'rows colder than the dew point of the design’s air',
		severity: 'caution',
		threshold: null,
		basis: practice('saturation pressure'),
		test: (context) =>
			context.rows.some(([{ temperature }]) => temperature !== undefined)
				? flagged(context, 'condensation')
				: notApplicable(ONE_TEMPERATURE)
	}
];
