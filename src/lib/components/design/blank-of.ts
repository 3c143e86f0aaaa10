import { findMaterial, formatDensity, formatRoughness, formatTemperature, unitOf, type UnitSystem } from '$lib/engine';
import { SETTING_NAMES } from '$lib/sheet/setting-names';

/** What holds where a setting is left blank, with its figure in the units of the design. */
export function blankOf(name: keyof typeof SETTING_NAMES, units: UnitSystem): string {
	if (name === 'temperature') return `${formatTemperature(20, units)} ${unitOf('temperature', units)}`;
	if (name === 'standardDensity')
		return units === 'SI' ? '1.204 kg/m³' : `${formatDensity(1.204, units)} ${unitOf('density', units)}`;
	const steel = name === 'material' ? findMaterial('galvanized-steel') : null;
	if (steel) return `galvanised steel, ${formatRoughness(steel.roughness, units)} ${unitOf('roughness', units)}`;
	return SETTING_NAMES[name].blank;
}
