// Entries, hoods, caps, louvres and plain exits.
import { at, DrawingBoard, line, type PartFigure, type Point } from './drawing-board';

const Y = 112;
const HALF = 34;
const END = 296;
const labelOf = (key: string) => `${key.replaceAll('-', ' ')}, seen in section`;

/** A duct from a place to the right end, cut off there. */
function duct(board: DrawingBoard, from: number, half = HALF): DrawingBoard {
	for (const sign of [-1, 1]) board.add('wall', line([from, Y + sign * half], [END, Y + sign * half]));
	return board
		.add('body', `M${from} ${Y - half}H${END}V${Y + half}H${from}z`)
		.add('axis', line([from - 22, Y], [END + 14, Y]))
		.broken([END, Y], 0, 2 * half)
		.dimension([268, Y - half], [268, Y + half], 'D');
}

/** Streams that gather before an opening. */
function gathering(board: DrawingBoard, x: number, reach = 44): DrawingBoard {
	const start = x - reach - 14;
	return board
		.flow([start, Y], 0, '', reach)
		.flow([start + 14, Y - 58], 34, '', reach)
		.flow([start + 14, Y + 58], -34, '', reach);
}

/** A wall in section, with an opening. */
function wall(board: DrawingBoard, x: number, half: number, thick = 16): DrawingBoard {
	return board.lined(x, 14, thick, Y - half - 14).lined(x, Y + half, thick, 210 - Y - half);
}

export function entry(key: string): PartFigure {
	const board = new DrawingBoard(labelOf(key));
	if (key === 'entry-angled') return angledEntry(board);
	if (key === 'entry-plain-end') return gathering(duct(board, 112), 100).figure();
	const inset = key === 'entry-projecting' ? 62 : 0;
	wall(board, 150, HALF + (inset > 0 ? 2 : 0));
	duct(board, 150 - inset);
	gathering(board, 138 - inset);
	if (inset === 0) return board.figure();
	board
		.dimension([88, Y - HALF], [150, Y - HALF], 'L', [0, -24])
		.add('solid', `M88 ${Y + HALF}h62v4h-62z`, `M88 ${Y - HALF}h62v-4h-62z`);
	board.add('thin', line([100, Y + HALF + 5], [108, Y + 66], [116, Y + 66])).letter([124, Y + 71], 't');
	return board.figure();
}

function angledEntry(board: DrawingBoard): PartFigure {
	const t = 60;
	const x = 120;
	const [a, b]: [Point, Point] = [
		[x, 92],
		[x, 170]
	];
	const way: Point = [150, -150 / Math.tan((t * Math.PI) / 180)];
	const [c, d]: [Point, Point] = [
		[a[0] + way[0], a[1] + way[1]],
		[b[0] + way[0], b[1] + way[1]]
	];
	const middle: Point = [x, 131];
	board
		.lined(x - 16, 14, 16, 78)
		.lined(x - 16, 170, 16, 56)
		.add('body', `${line(a, c, d, b)}z`)
		.add('wall', line(a, c), line(b, d))
		.add('axis', line(middle, [middle[0] + way[0] + 10, middle[1] + way[1] - 6]))
		.broken([(c[0] + d[0]) / 2, (c[1] + d[1]) / 2], -30, 68)
		.flow([40, 131], 0, '', 46)
		.flow([44, 74], 26, '', 46)
		.flow([44, 190], -26, '', 46)
		.angle([x, 170], 44, -90, -30, 'θ', 12);
	return board.note([x + 22, 222], 'wall', 'start').figure();
}

/** The lip of a bellmouth, free or in a wall. */
export function bellmouth(key: string): PartFigure {
	const board = new DrawingBoard(labelOf(key));
	const inWall = key === 'entry-bellmouth-in-wall';
	const r = 30;
	const x = 116;
	if (inWall) wall(board, x, HALF + r, 14);
	for (const sign of [-1, 1]) {
		board.add('wall', `M${x} ${Y + sign * (HALF + r)}A${r} ${r} 0 0 ${sign > 0 ? 1 : 0} ${x + r} ${Y + sign * HALF}`);
		board.add(
			'body',
			`M${x} ${Y + sign * (HALF + r)}A${r} ${r} 0 0 ${sign > 0 ? 1 : 0} ${x + r} ${Y + sign * HALF}V${Y}H${x}z`
		);
	}
	duct(board, x + r);
	gathering(board, 104, 40);
	const centre: Point = [x + r, Y - HALF - r];
	return board
		.ray(
			inWall ? [centre[0] + 26, centre[1] - 26] : centre,
			[x + r - r * 0.71 - 0, Y - HALF - r + r * 0.71],
			'r',
			inWall ? 0.1 : 0.36
		)
		.figure();
}

export function hood(key: string): PartFigure {
	const board = new DrawingBoard(labelOf(key));
	if (key === 'intake-hood') return cowl(board, true);
	const mouth = 130;
	if (key === 'hood-plain') return gathering(duct(board, mouth), 118).figure();
	if (key === 'hood-flanged') {
		for (const sign of [-1, 1]) board.add('wall', line([mouth, Y + sign * HALF], [mouth, Y + sign * (HALF + 56)]));
		return gathering(duct(board, mouth), 118).figure();
	}
	const [face, neck, wide] = [100, 168, 88];
	for (const sign of [-1, 1]) board.add('wall', line([face, Y + sign * wide], [neck, Y + sign * HALF]));
	board.add('body', `M${face} ${Y - wide}L${neck} ${Y - HALF}V${Y + HALF}L${face} ${Y + wide}z`);
	board.add('joint', line([neck, Y - HALF - 8], [neck, Y + HALF + 8]));
	duct(board, neck);
	const slope = (wide - HALF) / (neck - face);
	const apex: Point = [neck + HALF / slope, Y];
	const half = (Math.atan(slope) * 180) / Math.PI;
	for (const sign of [-1, 1]) board.add('dashed', line([neck, Y + sign * HALF], apex));
	board.angle(apex, 84, 180 - half, 180 + half, '').letter([apex[0] - 70, Y - 9], 'θ');
	for (const sign of [-1, 0, 1]) board.flow([42, Y + sign * 46], -sign * 10, '', 46);
	return board.figure();
}

/** A hood with its mouth downward, over a wall or a roof. */
function cowl(board: DrawingBoard, intake: boolean): PartFigure {
	board.lined(60, 176, 66, 14).lined(194, 176, 66, 14);
	board
		.add('body', 'M126 210V118H66V64A12 12 0 0 1 78 52H182A12 12 0 0 1 194 64V210z')
		.add('wall', 'M126 210V100M66 118V64A12 12 0 0 1 78 52H182A12 12 0 0 1 194 64V210M66 118H126')
		.add('axis', line([160, 226], [160, 84]));
	for (let x = 72; x < 124; x += 9) board.add('thin', line([x, 118], [x + 4, 112]));
	board.broken([160, 210], -90, 68).dimension([126, 200], [194, 200], 'D', [0, 0]);
	if (intake) board.flow([96, 168], -90, '', 42).flow([160, 128], 90, '', 38);
	else board.flow([160, 172], -90, '', 42).flow([96, 130], 90, '', 38);
	return board.figure();
}

export function cap(key: string): PartFigure {
	const board = new DrawingBoard(labelOf(key));
	if (key === 'exhaust-hood') return cowl(board, false);
	const intake = key.startsWith('intake');
	const [x, top, half] = [160, 92, 40];
	board
		.add('body', `M${x - half} ${top}h${2 * half}V206h${-2 * half}z`)
		.add('wall', line([x - half, top], [x - half, 206]), line([x + half, top], [x + half, 206]))
		.add('wall', `M${x - 76} 50H${x + 76}`, `M${x - 76} 50V44H${x + 76}V50`)
		.add('thin', line([x - 34, 50], [x - 34, top]), line([x + 34, 50], [x + 34, top]))
		.add('axis', line([x, 30], [x, 224]))
		.lined(x - 110, 160, 110 - half, 14)
		.lined(x + half, 160, 110 - half, 14)
		.broken([x, 206], -90, 2 * half)
		.dimension([x - half, 206], [x + half, 206], 'D', [0, 20])
		.add('thin', line([x + half + 5, top], [x + 72, top]))
		.dimension([x + 64, 50], [x + 64, top], 'h');
	return capArrows(board, intake, x);
}

function capArrows(board: DrawingBoard, intake: boolean, x: number): PartFigure {
	if (intake)
		board
			.flow([46, 72], 0, '', 44)
			.flow([x + 128, 72], 180, '', 40)
			.flow([x + 16, 112], 90, '', 38);
	else
		board
			.flow([x - 70, 72], 180, '', 40)
			.flow([x + 90, 72], 0, '', 40)
			.flow([x + 16, 150], -90, '', 38);
	return board.figure();
}

/** Blades in a wall, seen in section. */
export function louvre(key: string): PartFigure {
	const board = new DrawingBoard(labelOf(key));
	const intake = key.startsWith('intake');
	board.lined(110, 12, 26, 30).lined(110, 198, 26, 30).add('wall', 'M110 42H136M110 198H136');
	for (let y = 50; y < 190; y += 24) board.add('wall', line([108, y + 20], [138, y]));
	board
		.add('body', 'M136 42H296V198H136z')
		.add('wall', line([136, 42], [296, 42]), line([136, 198], [296, 198]))
		.add('axis', line([40, 120], [310, 120]))
		.broken([296, 120], 0, 156)
		.dimension([270, 42], [270, 198], 'H');
	for (const y of [78, 120, 162])
		if (intake) board.flow([52, y], 0, '', 42).flow([162, y], 0, '', 42);
		else board.flow([214, y], 180, '', 42).flow([98, y], 180, '', 42);
	return board.figure();
}

/** The air turns along a wall that stands before the end of the duct. */
function beforeWall(board: DrawingBoard): PartFigure {
	board.lined(236, 20, 14, 200).dimension([176, Y - HALF - 54], [236, Y - HALF - 54], 'h');
	for (const sign of [-1, 1])
		board.flow([182, Y + sign * 16], 0, '', 36).flow([214, Y + sign * (HALF - 6)], sign * 90, '', 44);
	return board.figure();
}

export function exit(key: string): PartFigure {
	const board = new DrawingBoard(labelOf(key));
	board
		.add('body', `M26 ${Y - HALF}H176V${Y + HALF}H26z`)
		.add('wall', line([26, Y - HALF], [176, Y - HALF]), line([26, Y + HALF], [176, Y + HALF]))
		.add('axis', line([12, Y], [300, Y]))
		.broken([26, Y], 0, 2 * HALF)
		.dimension([56, Y - HALF], [56, Y + HALF], 'D')
		.flow([86, Y], 0, '', 44);
	if (key === 'discharge-against-wall') return beforeWall(board);
	board.flow([186, Y], 0, '', 64);
	for (const sign of [-1, 1])
		board
			.flow([184, Y + sign * 24], sign * 14, '', 62)
			.add('dashed', `M176 ${Y + sign * HALF}C210 ${Y + sign * 44} 244 ${Y + sign * 60} ${at([276, Y + sign * 82])}`);
	return board.figure();
}
