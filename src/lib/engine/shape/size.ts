/** The inner size of a section [m]. A flat oval has straight sides and half-round ends; width and height are overall. */
export type Size =
	| { readonly shape: 'round'; readonly diameter: number }
	| { readonly shape: 'rectangular'; readonly width: number; readonly height: number }
	| { readonly shape: 'oval'; readonly width: number; readonly height: number };

export type Shape = Size['shape'];
