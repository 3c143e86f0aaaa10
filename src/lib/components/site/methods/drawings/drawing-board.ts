// What the drawings of the parts are made with: thin ink lines, dimensions with letters, arrows of flow.

/** A letter or a word on a drawing; what follows _ is set below the line. */
export interface Lettering {
	readonly x: number;
	readonly y: number;
	readonly text: string;
	readonly anchor: 'start' | 'middle' | 'end';
	readonly small: boolean;
	/** Stands on a line, which its halo breaks. */
	readonly broken: boolean;
}

/** A drawing as path data, by the kind of line. */
export interface PartFigure {
	readonly label: string;
	readonly height: number;
	readonly body: string;
	readonly wall: string;
	readonly joint: string;
	readonly thin: string;
	readonly axis: string;
	readonly dashed: string;
	readonly hatch: string;
	readonly solid: string;
	readonly flow: string;
	readonly flowHeads: string;
	readonly letters: readonly Lettering[];
}

export type Point = readonly [x: number, y: number];

export const WIDTH = 340;
export const HEIGHT = 240;

type Line = Exclude<keyof PartFigure, 'label' | 'height' | 'letters'>;

const short = (x: number): string => String(Math.round(x * 10) / 10);
const radians = (degrees: number): number => (degrees * Math.PI) / 180;

/** The point so far from another in a direction [°, clockwise from the right]. */
export function toward([x, y]: Point, degrees: number, distance: number): Point {
	return [x + distance * Math.cos(radians(degrees)), y + distance * Math.sin(radians(degrees))];
}

export const at = ([x, y]: Point): string => `${short(x)} ${short(y)}`;
export const line = (...points: readonly Point[]): string => `M${points.map(at).join('L')}`;
export const ring = (centre: Point, r: number): string =>
	`M${at(toward(centre, 180, r))}a${short(r)} ${short(r)} 0 1 1 ${short(2 * r)} 0a${short(r)} ${short(r)} 0 1 1 ${short(-2 * r)} 0z`;
export const box = (x: number, y: number, width: number, height: number): string =>
	`M${at([x, y])}h${short(width)}v${short(height)}h${short(-width)}z`;

export function arc(centre: Point, r: number, from: number, to: number): string {
	const large = Math.abs(to - from) > 180 ? 1 : 0;
	const end = at(toward(centre, to, r));
	return `M${at(toward(centre, from, r))}A${short(r)} ${short(r)} 0 ${large} ${to > from ? 1 : 0} ${end}`;
}

/** A drawing in the making. */
export class DrawingBoard {
	private readonly lines: Record<Line, string[]> = {
		body: [],
		wall: [],
		joint: [],
		thin: [],
		axis: [],
		dashed: [],
		hatch: [],
		solid: [],
		flow: [],
		flowHeads: []
	};
	private readonly letters: Lettering[] = [];

	constructor(private readonly label: string) {}

	add(kind: Line, ...paths: readonly string[]): this {
		this.lines[kind].push(...paths);
		return this;
	}

	/** A solid arrowhead, three times as long as wide. */
	head(tip: Point, degrees: number, kind: 'solid' | 'flowHeads' = 'solid', length = 9): this {
		const back = toward(tip, degrees + 180, length);
		return this.add(
			kind,
			`${line(tip, toward(back, degrees + 90, length / 3), toward(back, degrees - 90, length / 3))}z`
		);
	}

	letter([x, y]: Point, text: string, anchor: Lettering['anchor'] = 'middle'): this {
		return this.put([x, y], text, { anchor, small: false, broken: false });
	}

	private put([x, y]: Point, text: string, how: Omit<Lettering, 'x' | 'y' | 'text'>): this {
		this.letters.push({ x: Math.round(x * 10) / 10, y: Math.round(y * 10) / 10, text, ...how });
		return this;
	}

	/** A word in small lettering. */
	note(place: Point, text: string, anchor: Lettering['anchor'] = 'middle'): this {
		return this.put(place, text, { anchor, small: true, broken: false });
	}

	/** A dimension between two points, its letter in a gap of the line; extension lines reach back to where it was taken. */
	dimension(from: Point, to: Point, text: string, shift: Point = [0, 0]): this {
		const [a, b] = [from, to].map(([x, y]): Point => [x + shift[0], y + shift[1]]) as [Point, Point];
		const [dx, dy] = [b[0] - a[0], b[1] - a[1]];
		const degrees = (Math.atan2(dy, dx) * 180) / Math.PI;
		const room = Math.hypot(dx, dy) > 34;
		if (shift[0] !== 0 || shift[1] !== 0) {
			const way = (Math.atan2(shift[1], shift[0]) * 180) / Math.PI;
			this.add('thin', line(toward(from, way, 4), toward(a, way, 5)), line(toward(to, way, 4), toward(b, way, 5)));
		}
		if (room)
			this.add('thin', line(a, b))
				.head(a, degrees + 180)
				.head(b, degrees);
		else {
			this.add('thin', line(toward(a, degrees, -18), a), line(b, toward(b, degrees, 18)), line(a, b));
			this.head(a, degrees).head(b, degrees + 180);
		}
		const middle: Point = [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2];
		const [lx, ly] = room ? middle : toward(b, degrees, 27);
		return this.put([lx, ly + 5], text, { anchor: 'middle', small: false, broken: room });
	}

	/** A line with a head at its end and a letter on it. */
	ray(from: Point, to: Point, text: string, share = 0.5): this {
		const degrees = (Math.atan2(to[1] - from[1], to[0] - from[0]) * 180) / Math.PI;
		this.add('thin', line(from, to)).head(to, degrees);
		const [x, y] = [from[0] + share * (to[0] - from[0]), from[1] + share * (to[1] - from[1])];
		return this.put([x, y + 5], text, { anchor: 'middle', small: false, broken: true });
	}

	/** An angle between two directions, with heads at both ends. */
	angle(centre: Point, r: number, from: number, to: number, text: string, away = 13, share = 0.5): this {
		const lean = (9 / 2 / r) * (180 / Math.PI) * Math.sign(to - from);
		const turn = to > from ? 90 : -90;
		this.add('thin', arc(centre, r, from, to));
		if (Math.abs(to - from) * radians(r) > 26)
			this.head(toward(centre, from, r), from - turn + lean).head(toward(centre, to, r), to + turn - lean);
		const [x, y] = toward(centre, from + share * (to - from), r + away);
		return this.letter([x, y + 5], text);
	}

	/** An arrow of flow, its tail at a point. */
	flow(tail: Point, degrees: number, text = '', length = 34): this {
		const tip = toward(tail, degrees, length);
		this.add('flow', line(tail, toward(tip, degrees, -9))).head(tip, degrees, 'flowHeads', 12);
		if (text === '') return this;
		const [x, y] = toward(tail, degrees + 180, 11);
		return this.letter([x, y + 5], text);
	}

	/** The end of a duct that goes on: a thin line with a break in it, square to the duct. */
	broken(centre: Point, degrees: number, width: number): this {
		const across = degrees + 90;
		const reach = width / 2 + 7;
		return this.add(
			'thin',
			line(
				toward(centre, across, -reach),
				toward(centre, across, -7),
				toward(toward(centre, across, -3), degrees, 7),
				toward(toward(centre, across, 3), degrees, -7),
				toward(centre, across, 7),
				toward(centre, across, reach)
			)
		);
	}

	/** Section lining of a wall, at 45°. */
	lined(x: number, y: number, width: number, height: number): this {
		for (let k = -height + 3; k < width; k += 6) {
			const from = Math.max(0, k);
			const to = Math.min(width, k + height);
			if (to > from) this.add('hatch', line([x + from, y + height - (from - k)], [x + to, y + height - (to - k)]));
		}
		return this.add('joint', box(x, y, width, height));
	}

	/** The finished drawing, cut off below what is drawn. */
	figure(height = HEIGHT): PartFigure {
		const paths = Object.fromEntries(Object.entries(this.lines).map(([kind, parts]) => [kind, parts.join('')]));
		return { label: this.label, height, ...(paths as Record<Line, string>), letters: this.letters };
	}
}
