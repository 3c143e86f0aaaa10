/** The columns and settings that a person types into: how each text is read. */
import {
	materials,
	readDensity,
	readElevation,
	readCompression,
	readHumidity,
	readLength,
	readRate,
	readRise,
	readRoomPressure,
	readSize,
	readVelocity,
	type Reader,
	type Reading
} from '$lib/engine';
import {
	aspectRatio,
	flexFactor,
	outletFlow,
	standardDensity,
	temperatureAround,
	temperatureOfAir,
	testPressure
} from './bounded';
import { METHOD_READERS } from './methods';
import { readParts } from './parts';
import { readLeakage } from './read-leakage';
import { readLining } from './read-lining';
import { readOutlet } from './read-outlet';
import type { RowField, RowValues, SettingField, SettingValues } from './sheet';

const understood = <T>(value: T, words: string): Reading<T> => ({ ok: true, value, words, why: null, other: null });

/** A short text on one line. */
const readText =
	(what: string, most: number): Reader<string> =>
	(text) => {
		const value = text.replace(/\s+/g, ' ').trim();
		if (value.length <= most) return understood(value, value);
		return { ok: false, message: `This ${what} has ${value.length} characters.`, expected: `at most ${most}` };
	};

/** One of several words, or the beginning of one. */
function readChoice<T extends string>(choices: readonly { readonly key: T; readonly name: string }[]): Reader<T> {
	return (text) => {
		const wanted = text.trim().toLowerCase();
		const found =
			choices.find(({ key, name }) => key.toLowerCase() === wanted || name.toLowerCase() === wanted) ??
			(wanted
				? choices.find(({ key, name }) => key.toLowerCase().startsWith(wanted) || name.toLowerCase().startsWith(wanted))
				: null);
		if (found) return understood(found.key, found.name);
		return {
			ok: false,
			message: `“${text.trim()}” is none of the choices here.`,
			expected: choices.map(({ name }) => name).join(', ')
		};
	};
}

const readYesNo: Reader<boolean> = (text) => {
	const wanted = text.trim().toLowerCase();
	if (['yes', 'y', 'true', 'on', '1'].includes(wanted)) return understood(true, 'yes');
	if (['no', 'n', 'false', 'off', '0'].includes(wanted)) return understood(false, 'no');
	return { ok: false, message: `“${text.trim()}” is neither yes nor no.`, expected: 'yes or no' };
};

export const SIDES = [
	{ key: 'supply', name: 'Supply' },
	{ key: 'return', name: 'Return' },
	{ key: 'exhaust', name: 'Exhaust' },
	{ key: 'outdoor', name: 'Outdoor' }
] as const;

export const SERVICES = [
	{ key: 'general', name: 'General supply, return or exhaust' },
	{ key: 'kitchen-grease', name: 'Kitchen grease exhaust' },
	{ key: 'laboratory', name: 'Laboratory exhaust' },
	{ key: 'hazardous', name: 'Hazardous exhaust' },
	{ key: 'smoke-control', name: 'Smoke control' }
] as const;

const MATERIALS = Object.values(materials).map(({ key, name }) => ({ key, name }));

type Readers<V> = { readonly [F in keyof V]: Reader<V[F]> };

export const ROW_READERS: Readers<RowValues> = {
	tag: readText('tag', 40),
	joins: readText('tag', 40),
	side: readChoice(SIDES),
	serves: readText('text', 120),
	flow: outletFlow,
	size: readSize,
	length: readLength,
	rise: readRise,
	flex: readLength,
	material: readChoice(MATERIALS),
	lining: readLining,
	leakage: readLeakage,
	temperature: temperatureAround,
	parts: readParts,
	outlet: readOutlet,
	pressure: readRoomPressure
};

export const FLOW_BASES = [
	{ key: 'actual', name: 'Actual flows' },
	{ key: 'standard', name: 'Standard flows' }
] as const;

export const SETTING_READERS: Readers<SettingValues> = {
	title: readText('title', 120),
	units: readChoice([
		{ key: 'SI', name: 'SI' },
		{ key: 'IP', name: 'IP' }
	] as const),
	service: readChoice(SERVICES),
	temperature: temperatureOfAir,
	humidity: readHumidity,
	elevation: readElevation,
	density: readDensity,
	surroundings: temperatureAround,
	material: readChoice(MATERIALS),
	flexFactor,
	flexCompression: readCompression,
	leakage: readLeakage,
	testPressure,
	flowBasis: readChoice(FLOW_BASES),
	standardDensity,
	mainVelocity: readVelocity,
	runOutVelocity: readVelocity,
	frictionRate: readRate,
	flexibleLength: readLength,
	aspectRatio,
	damperAtOutlet: readYesNo,
	...METHOD_READERS
};

export const ROW_FIELDS = Object.keys(ROW_READERS) as RowField[];
export const SETTING_FIELDS = Object.keys(SETTING_READERS) as SettingField[];
export const isRowField = (key: string): key is RowField => Object.hasOwn(ROW_READERS, key);
export const isSettingField = (key: string): key is SettingField => Object.hasOwn(SETTING_READERS, key);
