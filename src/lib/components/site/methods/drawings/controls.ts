// Dampers, screens, plates, obstructions: what stands across a duct that runs from left to right.
import { arc, box, DrawingBoard, line, ring, toward, type PartFigure, type Point } from './drawing-board';

const Y = 104;
const [LEFT, RIGHT] = [22, 300];
const labelOf = (key: string) => `${key.replaceAll('-', ' ')}, seen in section`;

function duct(key: string, half = 48, letter = 'D'): DrawingBoard {
	const board = new DrawingBoard(labelOf(key));
	for (const sign of [-1, 1]) board.add('wall', line([LEFT, Y + sign * half], [RIGHT, Y + sign * half]));
	return board
		.add('body', box(LEFT, Y - half, RIGHT - LEFT, 2 * half))
		.add('axis', line([LEFT - 12, Y], [RIGHT + 14, Y]))
		.broken([LEFT, Y], 0, 2 * half)
		.broken([RIGHT, Y], 0, 2 * half)
		.dimension([270, Y - half], [270, Y + half], letter)
		.flow([40, Y], 0, '', 36);
}

export function damper(key: string): PartFigure {
	const board = duct(key);
	const hub: Point = [156, Y];
	const t = -38;
	board
		.add('wall', line(toward(hub, t, 46), toward(hub, t + 180, 46)))
		.add('solid', ring(hub, 4))
		.add('dashed', line([110, Y], [202, Y]))
		.add('thin', line(hub, [156, Y - 70]), line([156, Y - 70], [186, Y - 70]));
	return board.angle(hub, 40, t, 0, 'θ', 12).figure(196);
}

export function blades(key: string): PartFigure {
	const half = 66;
	const board = duct(key, half, 'H');
	const open = key === 'damper-blades-open';
	const opposed = key.includes('opposed');
	const x = 156;
	board.add('joint', box(x - 26, Y - half - 7, 52, 7), box(x - 26, Y + half, 52, 7));
	for (let i = 0; i < 4; i += 1) {
		const hub: Point = [x, Y - half + (half / 4) * (2 * i + 1)];
		const t = open ? 0 : opposed && i % 2 === 1 ? 36 : -36;
		board.add('wall', line(toward(hub, t, 16), toward(hub, t + 180, 16))).add('solid', ring(hub, 2.6));
	}
	if (open) {
		board.add('solid', box(x - 4, Y - half, 8, 8), box(x - 4, Y + half - 8, 8, 8));
		return board.dimension([x + 42, Y - half + 8], [x + 42, Y + half - 8], 'A_d').figure(196);
	}
	const third: Point = [x, Y + half / 4];
	return board
		.add('thin', line(third, [x + 66, third[1]]))
		.angle(third, 50, -36, 0, 'θ', 12)
		.figure(196);
}

export function gate(key: string): PartFigure {
	const board = duct(key, 48, 'H');
	const x = 150;
	return board
		.add('solid', box(x - 3, Y - 48, 6, 44))
		.add('wall', box(x - 3, Y - 92, 6, 88))
		.add('joint', box(x - 11, Y - 62, 8, 14), box(x + 3, Y - 62, 8, 14))
		.dimension([x + 26, Y - 4], [x + 26, Y + 48], 'h')
		.add('thin', line([x + 6, Y - 4], [x + 34, Y - 4]))
		.flow([x - 46, Y + 24], 0, '', 36)
		.figure(196);
}

export function firedamper(key: string): PartFigure {
	const board = duct(key, 48, 'H');
	const x = 150;
	board.lined(x - 22, 10, 44, Y - 48 - 14).lined(x - 22, Y + 52, 44, 44);
	board.add('wall', line([x - 30, Y - 52], [x + 30, Y - 52]), line([x - 30, Y + 52], [x + 30, Y + 52]));
	const fold = Array.from({ length: 6 }, (_, i): Point => [x - 9 + (i % 2) * 18, Y - 46 + i * 5]);
	board
		.add('wall', line(...fold))
		.add('thin', line([x + 12, Y - 34], [x + 46, Y - 14]))
		.note([x + 50, Y - 8], 'curtain', 'start');
	return board
		.note([x + 30, Y + 90], 'wall', 'start')
		.flow([100, Y + 16], 0, '', 36)
		.figure(206);
}

export function screen(key: string): PartFigure {
	const board = duct(key, 60, 'A');
	for (let y = Y - 54; y <= Y + 54; y += 12) board.add('solid', ring([140, y], 3));
	board.add('joint', line([140, Y - 60], [140, Y + 60]));
	return streams(board, 152, 12, 5)
		.letter([214, Y - 42], 'A_f')
		.figure(196);
}

/** Small streams behind openings. */
function streams(board: DrawingBoard, x: number, pitch: number, count: number): DrawingBoard {
	for (let i = 0; i < count; i += 1) {
		const y = Y + (i - (count - 1) / 2) * 2 * pitch;
		board.add('flow', line([x, y], [x + 26, y])).head([x + 34, y], 0, 'flowHeads', 9);
	}
	return board;
}

export function plate(key: string): PartFigure {
	const thick = key.endsWith('thick');
	const half = 60;
	const board = duct(key, half, 'A');
	const [x, width] = thick ? [134, 26] : [143, 5];
	for (let i = 0; i < 6; i += 1)
		board.add('solid', box(x, Y - half + i * 24 - (i === 0 ? 0 : 6), width, i === 0 || i === 5 ? 6 : 12));
	streams(board, x + width + 8, 12, 5).letter([222, Y - 42], 'A_f');
	if (thick) {
		board.dimension([x, Y + half], [x + width, Y + half], 't', [0, 20]);
		board
			.add('thin', line([x - 26, Y - 30], [x, Y - 30]), line([x - 26, Y - 18], [x, Y - 18]))
			.add('thin', line([x - 20, Y - 48], [x - 20, Y]));
		board
			.head([x - 20, Y - 30], 90)
			.head([x - 20, Y - 18], -90)
			.letter([x - 32, Y - 40], 'd');
	} else
		board
			.add('thin', line([x + 3, Y - half + 14], [x + 40, Y - half - 16], [x + 46, Y - half - 16]))
			.note([x + 50, Y - half - 12], 'sharp-edged holes', 'start');
	return board.figure(196);
}

export function obstruction(key: string): PartFigure {
	const board = duct(key, 60, 'A');
	const centre: Point = [150, Y];
	board.add('solid', ring(centre, 13));
	for (const sign of [-1, 1])
		board
			.add(
				'thin',
				`M90 ${Y + sign * 10}C120 ${Y + sign * 10} 124 ${Y + sign * 26} 150 ${Y + sign * 26}S190 ${Y + sign * 16} 214 ${Y + sign * 18}`
			)
			.add('thin', arc([184, Y + sign * 8], 6, 200, -100));
	board.add('thin', line([centre[0] + 8, Y - 11], [190, Y - 78], [198, Y - 78])).letter([212, Y - 73], 'A_m');
	return board.figure(196);
}
