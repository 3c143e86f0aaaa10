// A plot as plain data: everything in the units of its own picture, ready to be drawn.

/** A mark of an axis: where it stands and what it says. */
export interface Tick {
	readonly at: number;
	readonly text: string;
}

export interface PlotCurve {
	readonly name: string;
	/** Number of the line pattern; 0 is the heavy solid line */
	readonly pattern: number;
	readonly path: string;
	readonly end: readonly [x: number, y: number];
	/** Where its name starts; null when the name is not drawn */
	readonly nameAt: readonly [x: number, y: number] | null;
}

export interface Plot {
	readonly title: string;
	readonly width: number;
	readonly height: number;
	readonly frame: { readonly left: number; readonly right: number; readonly top: number; readonly bottom: number };
	readonly x: { readonly name: string; readonly ticks: readonly Tick[] };
	readonly y: { readonly name: string; readonly ticks: readonly Tick[] };
	/** Height of the line C = 0 where it is not the foot of the plot */
	readonly zero: number | null;
	/** Widths in which the source of the standard method gives no answer */
	readonly hatched: readonly (readonly [from: number, to: number])[];
	readonly curves: readonly PlotCurve[];
	/** Printed figures, as marks */
	readonly marks: readonly (readonly [x: number, y: number])[];
	/** What holds for the whole plot: the duct, and what is not drawn */
	readonly note: string;
}

/** A curve before it is drawn: coefficients over x, null where there is none. */
export interface Course {
	readonly name: string;
	readonly points: readonly { readonly x: number; readonly C: number | null }[];
}
