// A duct seen from the side, drawn along its centre line.
import { at, line, toward, type DrawingBoard, type Point } from './drawing-board';

/** One piece of a wall: straight, or an arc with its radius and sense. */
interface Piece {
	readonly from: Point;
	readonly to: Point;
	readonly radius: number;
	readonly clockwise: boolean;
}

const step = (to: Point, radius: number, clockwise: boolean): string =>
	radius > 0 ? `A${radius} ${radius} 0 0 ${clockwise ? 1 : 0} ${at(to)}` : `L${at(to)}`;
const onward = ({ to, radius, clockwise }: Piece): string => step(to, radius, clockwise);
const backward = ({ from, radius, clockwise }: Piece): string => step(from, radius, !clockwise);

/** Walks a duct of one width over the board; `end` draws it. */
export class DuctRun {
	private readonly start: Point;
	private readonly left: Piece[] = [];
	private readonly right: Piece[] = [];
	private readonly middle: Piece[] = [];
	private readonly joints: string[] = [];
	private corners: readonly [Point, Point];

	constructor(
		readonly board: DrawingBoard,
		public place: Point,
		public heading: number,
		private readonly width: number
	) {
		this.start = place;
		this.corners = this.sides();
	}

	private side(turn: number, reach = this.width / 2): Point {
		return toward(this.place, this.heading + turn, reach);
	}

	private sides(): readonly [Point, Point] {
		return [this.side(-90), this.side(90)];
	}

	/** Takes the walls to two new corners, and the centre line to where the walk now stands. */
	private reach(
		corners: readonly [Point, Point],
		from: Point,
		radii: readonly [number, number, number],
		clockwise = false
	) {
		const [left, right] = this.corners;
		this.left.push({ from: left, to: corners[0], radius: radii[0], clockwise });
		this.right.push({ from: right, to: corners[1], radius: radii[1], clockwise });
		this.middle.push({ from, to: this.place, radius: radii[2], clockwise });
		this.corners = corners;
		return this;
	}

	/** A line across the duct where one piece meets another. */
	joint(): this {
		this.joints.push(line(this.side(-90, this.width / 2 + 7), this.side(90, this.width / 2 + 7)));
		return this;
	}

	ahead(length: number): this {
		const from = this.place;
		this.place = toward(from, this.heading, length);
		return this.reach(this.sides(), from, [0, 0, 0]);
	}

	/** A smooth turn [°, clockwise above zero] with the radius of the centre line. */
	turn(degrees: number, radius: number): this {
		const from = this.place;
		const sign = Math.sign(degrees);
		const centre = toward(from, this.heading + 90 * sign, radius);
		this.heading += degrees;
		this.place = toward(centre, this.heading - 90 * sign, radius);
		const [outer, inner] = [radius + this.width / 2, radius - this.width / 2];
		return this.reach(this.sides(), from, sign > 0 ? [outer, inner, radius] : [inner, outer, radius], sign > 0);
	}

	/** A sharp turn, mitred; what comes next must go ahead. */
	mitre(degrees: number): this {
		const reach = this.width / 2 / Math.cos((degrees * Math.PI) / 360);
		const bisector = this.heading + degrees / 2;
		const corners = [toward(this.place, bisector - 90, reach), toward(this.place, bisector + 90, reach)] as const;
		for (const [pieces, corner] of [
			[this.left, corners[0]],
			[this.right, corners[1]]
		] as const) {
			const last = pieces.pop();
			if (last) pieces.push({ ...last, to: corner });
		}
		this.corners = corners;
		this.joints.push(line(...corners));
		this.heading += degrees;
		return this;
	}

	/** Draws the walls, the ground between them, the joints and the centre line. */
	end(): this {
		const way = (start: Point, pieces: readonly Piece[]) => `M${at(start)}${pieces.map(onward).join('')}`;
		const [left, right] = [this.left[0]?.from ?? this.start, this.right[0]?.from ?? this.start];
		const [, lastRight] = this.corners;
		const back = [...this.right].reverse().map(backward).join('');
		this.board
			.add('body', `${way(left, this.left)}L${at(lastRight)}${back}z`)
			.add('wall', way(left, this.left), way(right, this.right))
			.add('joint', ...this.joints)
			.add('axis', way(this.start, this.middle));
		return this;
	}
}
