/** Spreads of what a designer enters, where nothing better is known: fractions, one standard deviation. */
export const SPREADS = {
	coefficient: { spread: 0.25, basis: 'coefficient entered by hand: published methods differ by 30 to 50 %' },
	equipment: { spread: 0.1, basis: 'makers’ losses: common practice' },
	outlet: { spread: 0.1, basis: 'makers’ losses of terminals: common practice' },
	flexible: { spread: 0.5, basis: 'flexible duct as installed: published tests give 4 to 10 times the rigid rate' },
	roughness: { spread: 0.3, basis: 'roughness of a material without a published range: from memory' },
	density: { spread: 0.02, basis: 'temperature and weather about the design state: common practice' }
} as const;

export type SpreadName = keyof typeof SPREADS;
/** Spreads in place of the standing ones. */
export type SpreadOptions = { readonly [name in SpreadName]?: number };
