// What stands too near a fan: seen from the side, the wheel by its centre lines.
import { arc, box, DrawingBoard, line, ring, type PartFigure, type Point } from './drawing-board';

const labelOf = (key: string) => `${key.replaceAll('-', ' ')}, seen from the side`;

/** A casing round a wheel, its outlet upward to the right. */
function casing(board: DrawingBoard, [x, y]: Point): DrawingBoard {
	return board
		.add('body', ring([x, y], 63), box(x, y - 64, 70, 44))
		.add('wall', `M${x + 70} ${y - 64}H${x}A64 64 0 1 0 ${x + 58} ${y + 20}L${x + 48} ${y - 20}H${x + 70}`)
		.add('thin', ring([x, y], 40), ring([x, y], 5))
		.add('axis', line([x - 74, y], [x + 72, y]), line([x, y - 74], [x, y + 74]));
}

export function fanInlet(key: string): PartFigure {
	const board = new DrawingBoard(labelOf(key));
	board
		.add('body', 'M104 216V110A50 50 0 0 1 154 60H210V128H172V216z')
		.add('wall', 'M104 216V110A50 50 0 0 1 154 60H210M172 216V134A6 6 0 0 1 178 128H210')
		.add('axis', 'M138 228V106A12 12 0 0 1 150 94H300')
		.add('body', box(210, 24, 62, 176))
		.add('wall', box(210, 24, 62, 176))
		.add('dashed', 'M210 60H232A8 8 0 0 1 232 128H210', box(232, 48, 26, 92))
		.broken([138, 216], -90, 68)
		.dimension([104, 206], [172, 206], 'D', [0, 0])
		.flow([138, 192], -90, '', 44)
		.flow([180, 112], 0, '', 30)
		.flow([180, 76], 0, '', 18);
	return board.note([241, 216], 'fan').note([96, 52], 'elbow at the inlet', 'end').figure();
}

export function fanOutlet(key: string): PartFigure {
	const board = new DrawingBoard(labelOf(key));
	const centre: Point = [82, 126];
	casing(board, centre);
	board
		.add('body', box(152, 62, 96, 44), 'M248 62H254A30 30 0 0 0 284 32V14H328V32A74 74 0 0 1 254 106H248z')
		.add('wall', line([152, 62], [248, 62]), line([152, 106], [248, 106]))
		.add('wall', 'M248 62H254A30 30 0 0 0 284 32V14M248 106H254A74 74 0 0 0 328 32V14')
		.add('joint', line([152, 54], [152, 114]), line([248, 54], [248, 114]))
		.broken([306, 14], -90, 44)
		.dimension([152, 106], [248, 106], 'L', [0, 28])
		.flow([166, 84], 0, '', 44)
		.add('thin', arc(centre, 26, 200, 320))
		.head([centre[0] + 26 * Math.cos((320 * Math.PI) / 180), centre[1] + 26 * Math.sin((320 * Math.PI) / 180)], 56);
	return board.note([82, 214], 'fan').note([288, 128], 'elbow after it').figure();
}
