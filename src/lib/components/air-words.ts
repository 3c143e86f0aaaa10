import { formatDensity, formatElevation, formatTemperature, unitOf, type Solution, type UnitSystem } from '$lib/engine';
import { settingOf, type Sheet } from '$lib/sheet/sheet';

/** The state of the air in a few words, as "20 °C · 1.20 kg/m³ · sea level". */
export function airWords(sheet: Sheet, solution: Solution | null, units: UnitSystem): string {
	const density = solution ? `${formatDensity(solution.air.density, units)} ${unitOf('density', units)}` : null;
	if (settingOf(sheet, 'density') !== null) return [density, 'density as given'].filter(Boolean).join(' · ');
	const elevation = settingOf(sheet, 'elevation') ?? 0;
	const where = elevation === 0 ? 'sea level' : `${formatElevation(elevation, units)} ${unitOf('elevation', units)}`;
	const warmth = `${formatTemperature(settingOf(sheet, 'temperature') ?? 20, units)} ${unitOf('temperature', units)}`;
	return [warmth, density, where].filter(Boolean).join(' · ');
}
