// Changes of size, seen from the side with the flow from left to right.
import { at, box, DrawingBoard, line, ring, toward, type PartFigure, type Point } from './drawing-board';

const MIDDLE = 104;
const SMALL = 56;
const LARGE = 124;
const ENDS = [22, 262] as const;

const CORNERS = [
	[-1, -1],
	[1, -1],
	[-1, 1],
	[1, 1]
] as const;

/** Half heights at the start and the end, by whether the flow grows wider. */
const halvesOf = (key: string, grows = !key.includes('contraction')): readonly [number, number] =>
	grows ? [SMALL / 2, LARGE / 2] : [LARGE / 2, SMALL / 2];
const labelOf = (key: string) => `${key.replaceAll('-', ' ')}, seen from the side`;

/** The outline of a piece between two places along the duct, symmetrical or with a straight lower side. */
function outline(
	board: DrawingBoard,
	[h1, h2]: readonly [number, number],
	[x1, x2]: readonly [number, number],
	floor = false
) {
	const [left, right] = ENDS;
	const low = (h: number) => (floor ? MIDDLE + LARGE / 2 : MIDDLE + h);
	const high = (h: number) => (floor ? low(h) - 2 * h : MIDDLE - h);
	const top: Point[] = [
		[left, high(h1)],
		[x1, high(h1)],
		[x2, high(h2)],
		[right, high(h2)]
	];
	const bottom: Point[] = [
		[left, low(h1)],
		[x1, low(h1)],
		[x2, low(h2)],
		[right, low(h2)]
	];
	const middles: Point[] = top.map(([x, y], i): Point => [x, (y + (bottom[i]?.[1] ?? y)) / 2]);
	const [start, end] = [middles[0] ?? [left, MIDDLE], middles[3] ?? [right, MIDDLE]] as [Point, Point];
	board
		.add('body', `${line(...top, ...[...bottom].reverse())}z`)
		.add('wall', line(...top), line(...bottom))
		.broken(start, 0, 2 * h1)
		.broken(end, 0, 2 * h2)
		.flow([start[0] + 12, start[1]], 0, '', 30);
	const letters = h1 < h2 ? ['A_1', 'A_2'] : ['A_2', 'A_1'];
	board.letter([58, start[1] - h1 + 20], letters[0] ?? '').letter([234, end[1] - h2 + 20], letters[1] ?? '');
	return { start, end, top, bottom };
}

export function step(key: string): PartFigure {
	const board = new DrawingBoard(labelOf(key));
	const halves = halvesOf(key);
	const x = 142;
	outline(board, halves, [x, x]);
	board.add('axis', line([14, MIDDLE], [282, MIDDLE]));
	const [inner, outer] = [SMALL / 2, LARGE / 2];
	for (const sign of [-1, 1])
		board.add('joint', line([x, MIDDLE + sign * (inner - 0)], [x, MIDDLE + sign * (outer + 8)]));
	const deep = halves[0] < halves[1] ? [x + 6, x + 46] : [x - 6, x - 46];
	for (const sign of [-1, 1]) {
		const y = MIDDLE + sign * (inner + 17);
		board.add(
			'thin',
			`M${deep[0]} ${y}c${(deep[1] ?? 0) - (deep[0] ?? 0)} ${-11 * sign} ${(deep[1] ?? 0) - (deep[0] ?? 0)} ${11 * sign} 6 ${6 * sign}`
		);
	}
	return board.figure(196);
}

/** Cone, drawn with its included angle. */
function gradual(key: string): { board: DrawingBoard; halves: readonly [number, number] } {
	const board = new DrawingBoard(labelOf(key));
	const halves = halvesOf(key);
	const [x1, x2] = [92, 188];
	outline(board, halves, [x1, x2]);
	const grows = halves[0] < halves[1];
	const narrow = grows ? x1 : x2;
	const slope = (LARGE - SMALL) / 2 / (x2 - x1);
	const apex: Point = [grows ? narrow - SMALL / 2 / slope : narrow + SMALL / 2 / slope, MIDDLE];
	const half = (Math.atan(slope) * 180) / Math.PI;
	board.add('axis', line([14, MIDDLE], [282, MIDDLE]));
	for (const sign of [-1, 1]) {
		board.add('dashed', line(apex, [narrow, MIDDLE + (sign * SMALL) / 2]));
		for (const [x, h] of [
			[x1, halves[0]],
			[x2, halves[1]]
		] as const)
			board.add('joint', line([x, MIDDLE + sign * (h - 0)], [x, MIDDLE + sign * (h + 8)]));
	}
	const r = Math.abs((grows ? x2 : x1) - apex[0]) * 0.82;
	board.angle(apex, r, grows ? -half : 180 - half, grows ? half : 180 + half, '');
	board.letter([apex[0] + (grows ? 1 : -1) * (r - 12), MIDDLE - 8], 'θ');
	return { board, halves };
}

export const transition = (key: string): PartFigure => gradual(key).board.figure(196);

/** The section at the end, beside the side view: both outlines as they lie in one another. */
function endView(board: DrawingBoard, large: string, small: string): void {
	board.add('body', large).add('wall', large).add('joint', small);
}

export function pyramid(key: string): PartFigure {
	const { board } = gradual(key);
	const [x, y] = [306, 206];
	endView(board, box(x - 31, y - 31, 62, 62), box(x - 14, y - 14, 28, 28));
	for (const [sx, sy] of CORNERS) board.add('thin', line([x + 14 * sx, y + 14 * sy], [x + 31 * sx, y + 31 * sy]));
	return board.note([x - 40, y + 28], 'from the end', 'end').figure();
}

/** The square lies to the left or the right, and the larger section at either end. */
export function squareToRound(key: string): PartFigure {
	const board = new DrawingBoard(labelOf(key));
	const halves = halvesOf(key);
	const [x1, x2] = [92, 188];
	outline(board, halves, [x1, x2]);
	board.add('axis', line([14, MIDDLE], [282, MIDDLE]));
	const squareFirst = key.startsWith('rectangular');
	const [squareX, roundX] = squareFirst ? [x1, x2] : [x2, x1];
	const square = halves[squareFirst ? 0 : 1];
	for (const sign of [-1, 1]) {
		board.add('thin', line([squareX, MIDDLE + sign * square], [roundX, MIDDLE]));
		for (const [x, h] of [
			[x1, halves[0]],
			[x2, halves[1]]
		] as const)
			board.add('joint', line([x, MIDDLE], [x, MIDDLE + sign * (h + 8)]));
	}
	board.dimension([x1, MIDDLE + LARGE / 2], [x2, MIDDLE + LARGE / 2], 'L', [0, 20]);
	const [x, y] = [306, 206];
	const [s, r] = square > SMALL / 2 ? [31, 15] : [13, 31];
	const [rect, circle] = [box(x - s, y - s, 2 * s, 2 * s), ring([x, y], r)];
	endView(board, s > r ? rect : circle, s > r ? circle : rect);
	for (const [sx, sy] of CORNERS)
		board.add('thin', line([x + s * sx, y + s * sy], [x + r * sx, y]), line([x + s * sx, y + s * sy], [x, y + r * sy]));
	return board.note([x - 40, y + 28], 'from the end', 'end').figure();
}

export function oneSided(key: string): PartFigure {
	const board = new DrawingBoard(labelOf(key));
	const halves = halvesOf(key);
	const [x1, x2] = [92, 188];
	const { top, bottom } = outline(board, halves, [x1, x2], true);
	for (const [i, x] of [
		[1, x1],
		[2, x2]
	] as const)
		board.add('joint', line([x, (top[i]?.[1] ?? 0) - 8], [x, (bottom[i]?.[1] ?? 0) + 8]));
	const slope = (Math.atan2(LARGE - SMALL, x2 - x1) * 180) / Math.PI;
	const grows = halves[0] < halves[1];
	const foot = top[grows ? 1 : 2] ?? [x1, MIDDLE];
	const way = grows ? 1 : -1;
	return board
		.add('thin', line(foot, [foot[0] + way * 92, foot[1]]))
		.angle(foot, 70, grows ? -slope : 180, grows ? 0 : 180 + slope, 'θ', -14)
		.figure(196);
}

/** A cone at the end of a duct, open to the room. */
export function exitDiffuser(key: string): PartFigure {
	const board = new DrawingBoard(labelOf(key));
	const [x1, x2] = [96, 214];
	const [h1, h2] = [26, 58];
	const top: Point[] = [
		[22, MIDDLE - h1],
		[x1, MIDDLE - h1],
		[x2, MIDDLE - h2]
	];
	const bottom = top.map(([x, y]): Point => [x, 2 * MIDDLE - y]);
	const apex: Point = [x1 - (h1 * (x2 - x1)) / (h2 - h1), MIDDLE];
	const half = (Math.atan2(h2 - h1, x2 - x1) * 180) / Math.PI;
	board
		.add('body', `${line(...top)}L${[...bottom].reverse().map(at).join('L')}z`)
		.add('wall', line(...top), line(...bottom))
		.add('joint', line([x1, MIDDLE - h1 - 8], [x1, MIDDLE + h1 + 8]))
		.add('axis', line([14, MIDDLE], [300, MIDDLE]))
		.broken([22, MIDDLE], 0, 2 * h1)
		.flow([34, MIDDLE], 0, '', 30)
		.letter([80, MIDDLE + 19], 'A_1')
		.letter([x2 + 14, MIDDLE - h2 + 12], 'A_2', 'start');
	for (const sign of [-1, 1])
		board
			.add('dashed', line(toward(apex, sign * half, 40), [x1, MIDDLE + sign * h1]))
			.flow([226, MIDDLE + sign * 30], sign * 16, '', 38);
	return board
		.flow([226, MIDDLE - 0], 0, '', 38)
		.angle(apex, 170, -half, half, '')
		.letter([apex[0] + 184, MIDDLE - 9], 'θ')
		.figure(196);
}
