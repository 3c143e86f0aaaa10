/** The interval that a value is outside of. */
interface Bounds {
	readonly min: number;
	readonly max: number;
}

/**
 * A computed figure as a message carries it: four significant digits, and more only where fewer would seem to lie
 * within the range that it is outside of.
 */
export function shortFigure(value: number, range: Bounds | null = null): string {
	for (let digits = 4; range !== null && digits < 17; digits += 1) {
		const rounded = Number(value.toPrecision(digits));
		if (!(rounded >= range.min && rounded <= range.max)) return String(rounded);
	}
	return String(Number(value.toPrecision(range === null ? 4 : 17)));
}
