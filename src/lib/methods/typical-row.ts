import { airState, findMaterial, frictionFactor, sectionOf, type FittingContext, type Size } from '$lib/engine';

/** The ducts for which coefficients are plotted [m]. */
const SIZES: Readonly<Record<Size['shape'], Size>> = {
	round: { shape: 'round', diameter: 0.5 },
	rectangular: { shape: 'rectangular', width: 0.5, height: 0.5 },
	oval: { shape: 'oval', width: 0.6, height: 0.3 }
};
const VELOCITY = 8; // m/s
const WORDS: Readonly<Record<Size['shape'], string>> = {
	round: 'Ø500',
	rectangular: '500 × 500',
	oval: 'oval 600 × 300'
};

/** A row such as the plots are drawn for, and what is said of it. */
export function typicalRow(shape: Size['shape']): { context: FittingContext; words: string } {
	const size = SIZES[shape];
	const { density, viscosity } = airState({ temperature: 20, elevation: 0 });
	const { hydraulicDiameter } = sectionOf(size);
	const reynolds = (density * VELOCITY * hydraulicDiameter) / viscosity;
	const relativeRoughness = (findMaterial('galvanized-steel')?.roughness ?? 0) / hydraulicDiameter;
	const context: FittingContext = {
		size,
		reynolds,
		velocity: VELOCITY,
		relativeRoughness,
		frictionFactor: frictionFactor({ reynolds, relativeRoughness })
	};
	return { context, words: `${WORDS[shape]} mm of galvanised steel, ${VELOCITY} m/s, air of 20 °C` };
}
