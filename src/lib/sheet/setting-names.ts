/** The settings of a design in words, and what a blank means. Units are switched in the title block. */
import type { QuantityName } from '$lib/engine';
import type { SettingField } from './sheet';

export interface SettingName {
	readonly name: string;
	readonly quantity?: QuantityName;
	/** What holds when it is left blank. */
	readonly blank: string;
}

export const SETTING_NAMES = {
	title: { name: 'Title on reports', blank: 'the tag of the system' },
	service: { name: 'Service', blank: 'not named yet; taken as general' },
	temperature: { name: 'Temperature of the air', quantity: 'temperature', blank: '20 °C' },
	humidity: { name: 'Relative humidity', quantity: 'humidity', blank: '50 %' },
	elevation: { name: 'Elevation', quantity: 'elevation', blank: 'sea level' },
	density: { name: 'Density, if given', quantity: 'density', blank: 'computed from the three above' },
	surroundings: {
		name: 'Temperature around the ducts',
		quantity: 'temperature',
		blank: 'as inside: no thermal gravity'
	},
	material: { name: 'Material of the ducts', blank: 'galvanised steel, 0.09 mm' },
	flexFactor: { name: 'Flexible duct, times the rigid rate', blank: '4, the program’s default; illustrative' },
	mainVelocity: { name: 'Velocity in mains, at most', quantity: 'velocity', blank: 'not checked' },
	runOutVelocity: { name: 'Velocity in run-outs, at most', quantity: 'velocity', blank: 'not checked' },
	frictionRate: { name: 'Friction rate, at most', quantity: 'rate', blank: 'not checked' },
	flexibleLength: { name: 'Flexible duct at an outlet, at most', quantity: 'length', blank: 'not checked' },
	aspectRatio: { name: 'Aspect ratio, at most', blank: '4, common practice' },
	damperAtOutlet: { name: 'A damper at every outlet', blank: 'not checked' }
} as const satisfies Partial<Record<SettingField, SettingName>>;
