// Junctions, drawn as a stream that divides: c the common leg, s the straight one, b the branch.
import { box, DrawingBoard, line, toward, type PartFigure, type Point } from './drawing-board';

const Y = 166;
const HALF = 32;
const [LEFT, RIGHT] = [22, 312];
const labelOf = (key: string) => `${key.replaceAll('-', ' ')}, common leg c, straight leg s, branch b`;

const LEG = { c: 'Q_c, A_c', s: 'Q_s, A_s', b: 'Q_b, A_b' } as const;

/** The main duct with its lower wall whole; the upper wall is left open between two places. */
function main(key: string, open: readonly [number, number], both = false): DrawingBoard {
	const board = new DrawingBoard(labelOf(key));
	const y = both ? 120 : Y;
	board
		.add('body', box(LEFT, y - HALF, RIGHT - LEFT, 2 * HALF))
		.add('wall', line([LEFT, y - HALF], [open[0], y - HALF]), line([open[1], y - HALF], [RIGHT, y - HALF]))
		.add('axis', line([LEFT - 12, y], [RIGHT + 12, y]))
		.broken([LEFT, y], 0, 2 * HALF)
		.broken([RIGHT, y], 0, 2 * HALF)
		.flow([42, y], 0, '', 38)
		.flow([244, y], 0, '', 38)
		.letter([66, y + HALF + 20], LEG.c)
		.letter([272, y + HALF + 20], LEG.s);
	if (both)
		board.add('wall', line([LEFT, y + HALF], [open[0], y + HALF]), line([open[1], y + HALF], [RIGHT, y + HALF]));
	else board.add('wall', line([LEFT, y + HALF], [RIGHT, y + HALF]));
	return board;
}

/** A branch upward between two places, to the top of the board. */
function upward(board: DrawingBoard, left: number, right: number, from = Y - HALF): DrawingBoard {
	const middle = (left + right) / 2;
	return board
		.add('body', box(left, 24, right - left, from - 24))
		.add('wall', line([left, from], [left, 24]), line([right, from], [right, 24]))
		.add('axis', line([middle, Y], [middle, 12]))
		.broken([middle, 24], -90, right - left)
		.flow([middle, 104], -90, '', 40)
		.letter([right + 12, 56], LEG.b, 'start');
}

export function tee(key: string): PartFigure {
	const board = upward(main(key, [136, 184]), 136, 184);
	return board.angle([160, Y], 26, -90, 0, 'θ', 12, 0.72).figure();
}

/** A wye; a conical take-off at 45° is none. */
export function wye(key: string): PartFigure {
	const t = -45;
	const half = 23;
	const foot: Point = [128, Y];
	const end = toward(foot, t, 176);
	const wide = half / Math.sin(Math.PI / 4);
	const x = foot[0] + HALF;
	const [a, b]: [Point, Point] = [
		[x - wide, Y - HALF],
		[x + wide, Y - HALF]
	];
	const [c, d] = [toward(end, t - 90, half), toward(end, t + 90, half)];
	return main(key, [a[0], b[0]])
		.add('body', `${line(a, c, d, b)}z`)
		.add('wall', line(a, c), line(b, d))
		.add('axis', line(foot, toward(end, t, 12)))
		.broken(end, t, 2 * half)
		.flow(toward(foot, t, 92), t, '', 42)
		.letter([end[0] + 26, end[1] + 34], LEG.b, 'start')
		.angle(foot, 48, t, 0, 'θ', 13)
		.figure();
}

export function shoe(key: string): PartFigure {
	const [left, right, lead] = [142, 190, 40];
	const board = upward(main(key, [left - lead, right]), left, right, Y - HALF - lead);
	return board
		.add('body', `M${left} ${Y - HALF - lead}L${left - lead} ${Y - HALF}H${right}V${Y - HALF - lead}z`)
		.add(
			'wall',
			line([left, Y - HALF - lead], [left - lead, Y - HALF]),
			line([right, Y - HALF - lead], [right, Y - HALF])
		)
		.add('joint', line([left - 8, Y - HALF - lead], [right + 8, Y - HALF - lead]))
		.add('thin', line([left - lead, Y - HALF], [left - lead - 0, Y - HALF]))
		.angle([left - lead, Y - HALF], 30, -45, 0, 'θ', 11)
		.figure();
}

export function conical(key: string): PartFigure {
	const [left, right, flare, tall] = [138, 182, 20, 40];
	const board = upward(main(key, [left - flare, right + flare]), left, right, Y - HALF - tall);
	const sides = [
		line([left, Y - HALF - tall], [left - flare, Y - HALF]),
		line([right, Y - HALF - tall], [right + flare, Y - HALF])
	];
	return board
		.add(
			'body',
			`M${left} ${Y - HALF - tall}L${left - flare} ${Y - HALF}H${right + flare}L${right} ${Y - HALF - tall}z`
		)
		.add('wall', ...sides)
		.add('joint', line([left - 8, Y - HALF - tall], [right + 8, Y - HALF - tall]))
		.angle([160, Y], 26, -90, 0, 'θ', 12, 0.72)
		.figure();
}

export function cross(key: string): PartFigure {
	const board = main(key, [138, 182], true);
	for (const [from, to, way, text] of [
		[88, 18, -90, LEG.b],
		[152, 222, 90, LEG.b]
	] as const) {
		board
			.add('body', box(138, Math.min(from, to), 44, 70))
			.add('wall', line([138, from], [138, to]), line([182, from], [182, to]))
			.add('axis', line([160, 120], [160, to + (way > 0 ? 10 : -10)]))
			.broken([160, to], way, 44)
			.flow([160, from + (way > 0 ? 10 : -10)], way, '', 38)
			.letter([194, way > 0 ? 216 : 40], text, 'start');
	}
	return board.figure();
}

export function bullhead(key: string): PartFigure {
	const board = new DrawingBoard(`${key.replaceAll('-', ' ')}, common leg c, two branches b`);
	const [left, right] = [134, 186];
	const [top, bottom] = [40, 96];
	board
		.add('body', box(LEFT, top, RIGHT - LEFT, bottom - top), box(left, bottom, right - left, 116))
		.add('wall', line([LEFT, top], [RIGHT, top]))
		.add(
			'wall',
			line([LEFT, bottom], [left, bottom], [left, 212]),
			line([RIGHT, bottom], [right, bottom], [right, 212])
		)
		.add('axis', line([LEFT - 10, 68], [RIGHT + 10, 68]), line([160, 226], [160, 68]))
		.broken([LEFT, 68], 0, 56)
		.broken([RIGHT, 68], 0, 56)
		.broken([160, 212], -90, 52)
		.flow([160, 176], -90, '', 42)
		.flow([112, 68], 180, '', 42)
		.flow([208, 68], 0, '', 42)
		.letter([198, 182], LEG.c, 'start')
		.letter([62, bottom + 20], LEG.b)
		.letter([262, bottom + 20], LEG.b);
	return board.figure();
}

export function plenum(key: string): PartFigure {
	const board = new DrawingBoard(`${key.replaceAll('-', ' ')}: a chamber with the common leg c and legs b`);
	const chamber = box(112, 26, 116, 184);
	board
		.add('body', chamber, box(22, 94, 90, 48), box(228, 52, 84, 36), box(228, 142, 84, 44))
		.add('wall', line([22, 94], [112, 94], [112, 26], [228, 26], [228, 52], [312, 52]))
		.add('wall', line([22, 142], [112, 142], [112, 210], [228, 210], [228, 186], [312, 186]))
		.add('wall', line([312, 88], [228, 88], [228, 142], [312, 142]))
		.add('axis', line([12, 118], [126, 118]), line([214, 70], [324, 70]), line([214, 164], [324, 164]))
		.broken([22, 118], 0, 48)
		.broken([312, 70], 0, 36)
		.broken([312, 164], 0, 44)
		.flow([40, 118], 0, '', 40)
		.flow([246, 70], 0, '', 40)
		.flow([246, 164], 0, '', 40)
		.dimension([144, 26], [144, 210], 'A_p')
		.letter([62, 164], LEG.c)
		.letter([272, 110], LEG.b)
		.letter([272, 208], LEG.b);
	return board.figure();
}
