// Elbows and offsets, in the plane of the bend.
import { arc, DrawingBoard, line, toward, type PartFigure, type Point } from './drawing-board';
import { DuctRun } from './duct-run';
import { sectionInset } from './section-inset';

type Section = 'round' | 'rectangular' | 'oval';
const sectionOf = (key: string): Section =>
	key.startsWith('oval')
		? 'oval'
		: key.startsWith('rectangular') || key === 'offset-rectangular'
			? 'rectangular'
			: 'round';
const sideOf = (section: Section) => (section === 'round' ? 'D' : 'W');

const CENTRE: Point = [186, 148];
const RADIUS = 92;
const SIDE = 62;

/** What a bend from below to the right has in common: ends, dimension, flow, centre of the bend and its angle. */
function bendLettering(board: DrawingBoard, section: Section): void {
	board
		.broken([CENTRE[0] - RADIUS, 206], -90, SIDE)
		.broken([300, CENTRE[1] - RADIUS], 0, SIDE)
		.dimension([CENTRE[0] - RADIUS - SIDE / 2, 206], [CENTRE[0] - RADIUS + SIDE / 2, 206], sideOf(section), [0, 22])
		.flow([CENTRE[0] - RADIUS, 196], -90)
		.add('thin', line([CENTRE[0] - RADIUS + SIDE / 2 + 2, CENTRE[1]], [CENTRE[0] + 6, CENTRE[1]]))
		.add('thin', line([CENTRE[0], CENTRE[1] - RADIUS + SIDE / 2 + 2], [CENTRE[0], CENTRE[1] + 6]))
		.angle(CENTRE, 26, 180, 270, 'θ', 13, 0.82);
	sectionInset(board, section, [272, 158]);
}

function bend(key: string): DuctRun {
	const board = new DrawingBoard(`${key.replaceAll('-', ' ')}, seen in the plane of the bend`);
	return new DuctRun(board, [CENTRE[0] - RADIUS, 206], -90, SIDE);
}

export function elbow(key: string): PartFigure {
	const run = bend(key);
	run
		.ahead(206 - CENTRE[1])
		.joint()
		.turn(90, RADIUS)
		.joint()
		.ahead(114)
		.end();
	bendLettering(run.board, sectionOf(key));
	return run.board.ray(CENTRE, toward(CENTRE, 225, RADIUS), 'r', 0.62).figure();
}

export function segmented(key: string): PartFigure {
	const pieces = key === 'oval-elbow-segmented' ? 5 : 4;
	const run = bend(key);
	const unit = 90 / (2 * (pieces - 1));
	const half = RADIUS * Math.tan((unit * Math.PI) / 180);
	run.ahead(206 - CENTRE[1]).ahead(half);
	for (let i = 1; i < pieces; i += 1) run.mitre(2 * unit).ahead(i === pieces - 1 ? half : 2 * half);
	run.ahead(114).end();
	bendLettering(run.board, sectionOf(key));
	return run.board.ray(CENTRE, toward(CENTRE, 225, RADIUS), 'r', 0.62).figure();
}

/** A sharp corner from below to the right, in a wide duct. */
function corner(key: string, side: number): DrawingBoard {
	const board = new DrawingBoard(`${key.replaceAll('-', ' ')}, seen in the plane of the bend`);
	const section = sectionOf(key);
	const [x, y] = [66 + side / 2, 28 + side / 2];
	new DuctRun(board, [x, 206], -90, side)
		.ahead(206 - y)
		.mitre(90)
		.ahead(300 - x)
		.end();
	board
		.broken([x, 206], -90, side)
		.broken([300, y], 0, side)
		.dimension([x - side / 2, 206], [x + side / 2, 206], sideOf(section), [0, 22])
		.flow([x, 198], -90);
	sectionInset(board, section, [262, 168]);
	return board;
}

export function mitred(key: string): PartFigure {
	const board = corner(key, 84);
	const turn: Point = [108, 70];
	return board
		.add('thin', line(turn, [turn[0], 12]))
		.angle(turn, 46, -90, 0, 'θ', 12)
		.figure();
}

/** Vanes of one thickness, or hollow ones. */
export function vaned(key: string): PartFigure {
	const side = 96;
	const board = corner(key, side);
	const hollow = key.endsWith('double');
	const r = 24;
	const [innerX, innerY] = [66 + side, 28 + side];
	for (let i = 1; i <= 4; i += 1) {
		const share = i / 5;
		const centre: Point = [innerX - share * side + r * 0.6, innerY - share * side + r * 0.6];
		const outer = arc(centre, r, 180, 270);
		if (hollow) {
			const back = `A${r * 1.5} ${r * 1.5} 0 0 0 ${centre[0] - r} ${centre[1]}z`;
			board.add('solid', `${outer}${back}`).add('wall', outer);
		} else board.add('wall', outer);
	}
	const first: Point = [innerX - 0.2 * side + r * 0.6, innerY - 0.2 * side + r * 0.6];
	const second: Point = [first[0] - side / 5, first[1] - side / 5];
	board.add('thin', line([first[0] - r * 0.7 - 0, first[1] - r * 0.7], [206, 176]), line([206, 176], [214, 176]));
	board.letter([222, 181], 'r');
	const away = 118;
	const [a, b] = [toward(first, 225, r), toward(second, 225, r)].map((place) => toward(place, 45, 0)) as [Point, Point];
	board.add(
		'thin',
		line(toward(a, -45, 4), toward(a, -45, away * 0.62)),
		line(toward(b, -45, 4), toward(b, -45, away * 0.62))
	);
	const [s, t] = [toward(a, -45, away * 0.58), toward(b, -45, away * 0.58)];
	return board
		.add('thin', line(toward(s, 45, 14), toward(t, 225, 14)))
		.head(s, 225)
		.head(t, 45)
		.letter(toward(s, 45, 24), 's')
		.figure();
}

export function splitter(key: string): PartFigure {
	const run = bend(key);
	run
		.ahead(206 - CENTRE[1])
		.joint()
		.turn(90, RADIUS)
		.joint()
		.ahead(114)
		.end();
	const throat = RADIUS - SIDE / 2;
	const ratio = Math.sqrt(throat / (throat + SIDE));
	bendLettering(run.board, sectionOf(key));
	return run.board
		.add('wall', arc(CENTRE, throat / ratio, 180, 270))
		.ray(CENTRE, toward(CENTRE, 205, RADIUS), 'r', 0.55)
		.ray(CENTRE, toward(CENTRE, 235, throat / ratio), 'R_1', 0.72)
		.figure();
}

export function offset(key: string): PartFigure {
	const sharp = key === 'offset-mitred';
	const section = sectionOf(key);
	const board = new DrawingBoard(`${key.replaceAll('-', ' ')}: two elbows and the straight duct between them`);
	const run = new DuctRun(board, [20, 176], 0, 46);
	const places: Point[] = [];
	if (sharp) run.ahead(84).mitre(-45).ahead(140).mitre(45).ahead(110).end();
	else {
		run.ahead(44).joint().turn(-45, 69).joint();
		places.push(run.place);
		run.ahead(58).joint();
		places.push(run.place);
		run.turn(45, 69).joint().ahead(72).end();
	}
	const [a, b] = sharp ? ([[104, 176], toward([104, 176], -45, 140)] as [Point, Point]) : (places as [Point, Point]);
	const turn: Point = sharp ? [104, 176] : [64 + 69 * Math.tan(Math.PI / 8), 176];
	const end: Point = [run.place[0], run.place[1]];
	return board
		.broken([20, 176], 0, 46)
		.broken(end, 0, 46)
		.dimension([20, 153], [20, 199], section === 'rectangular' ? 'W' : 'D', [18, 0])
		.dimension(a, b, 'L', [-34 * Math.SQRT1_2, -34 * Math.SQRT1_2])
		.add('thin', line(turn, [turn[0] + 74, turn[1]]))
		.angle(turn, 62, 0, -45, 'θ', 12, 0.3)
		.flow([52, 176], 0, '', 30)
		.figure();
}
