/** What is computed outside the catalogue of fittings, as the method notes show it. */
export interface FormulaNote {
	readonly name: string;
	/** What stands in ^{…} is raised. */
	readonly equation: string;
	/** Symbols with their units. */
	readonly where: string;
	readonly range: string;
	readonly source: string;
	readonly caution?: string;
}

export interface FormulaGroup {
	readonly id: string;
	readonly title: string;
	readonly lead: string;
	readonly formulas: readonly FormulaNote[];
}
