/** The settings of a design in words, and what a blank means. Units are switched in the title block. */
import type { QuantityName } from '$lib/engine';
import type { SettingField } from './sheet';

export interface SettingName {
	readonly name: string;
	readonly quantity?: QuantityName;
	/** What holds when it is left blank. */
	readonly blank: string;
	/** What the figures stand on while it is not understood. */
	readonly meanwhile: string;
}

const notChecked = (what: string) => ({ blank: 'not checked', meanwhile: `${what} is not checked` });

export const SETTING_NAMES = {
	title: {
		name: 'Title on reports',
		blank: 'the tag of the system',
		meanwhile: 'reports carry the tag of the system'
	},
	service: { name: 'Service', blank: 'not named yet; taken as general', meanwhile: 'it is taken as general' },
	temperature: {
		name: 'Temperature of the air',
		quantity: 'temperature',
		blank: '20 °C',
		meanwhile: 'the air is taken at 20 °C (68 °F)'
	},
	humidity: {
		name: 'Relative humidity',
		quantity: 'humidity',
		blank: '50 %',
		meanwhile: 'the air is taken at 50 %'
	},
	elevation: {
		name: 'Elevation',
		quantity: 'elevation',
		blank: 'sea level',
		meanwhile: 'the place is taken at sea level'
	},
	density: {
		name: 'Density, if given',
		quantity: 'density',
		blank: 'computed from the three above',
		meanwhile: 'it is computed from temperature, humidity and elevation'
	},
	surroundings: {
		name: 'Temperature around the ducts',
		quantity: 'temperature',
		blank: 'as inside: no thermal gravity',
		meanwhile: 'it is taken as inside, without thermal gravity'
	},
	material: {
		name: 'Material of the ducts',
		blank: 'galvanised steel, 0.09 mm',
		meanwhile: 'ducts are taken as galvanised steel, 0.09 mm'
	},
	flexFactor: {
		name: 'Flexible duct, times the rigid rate',
		blank: '4, the program’s default; illustrative',
		meanwhile: 'flexible duct is taken at 4 times the rigid rate'
	},
	flexCompression: {
		name: 'Flexible duct, compressed by',
		quantity: 'humidity',
		blank: 'not known: by the factor above',
		meanwhile: 'flexible duct is taken by its factor on the rigid rate'
	},
	leakage: {
		name: 'Leakage class of the ductwork',
		blank: 'none: no leakage is counted',
		meanwhile: 'no leakage is counted'
	},
	flowBasis: {
		name: 'Flows of outlets are',
		blank: 'actual flows',
		meanwhile: 'they are taken as actual flows'
	},
	standardDensity: {
		name: 'Density of standard air',
		quantity: 'density',
		blank: '1.204 kg/m³',
		meanwhile: 'it is taken as 1.204 kg/m³'
	},
	testPressure: {
		name: 'Test pressure of the ductwork',
		quantity: 'pressure',
		blank: 'none: no allowable leakage is told',
		meanwhile: 'no allowable leakage is told'
	},
	mainVelocity: { name: 'Velocity in mains, at most', quantity: 'velocity', ...notChecked('it') },
	runOutVelocity: { name: 'Velocity in run-outs, at most', quantity: 'velocity', ...notChecked('it') },
	frictionRate: { name: 'Friction rate, at most', quantity: 'rate', ...notChecked('it') },
	flexibleLength: { name: 'Flexible duct at an outlet, at most', quantity: 'length', ...notChecked('its length') },
	aspectRatio: {
		name: 'Aspect ratio, at most',
		blank: '4, common practice',
		meanwhile: 'it is checked against 4, common practice'
	},
	damperAtOutlet: { name: 'A damper at every outlet', ...notChecked('it') }
} as const satisfies Partial<Record<SettingField, SettingName>>;
