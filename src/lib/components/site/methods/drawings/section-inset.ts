// The section of a duct, drawn beside it where it is not round.
import { box, type DrawingBoard, type Point } from './drawing-board';

/** Draws the section with W in the plane of the drawing and H across it. */
export function sectionInset(board: DrawingBoard, section: 'round' | 'rectangular' | 'oval', [x, y]: Point): void {
	if (section === 'round') return;
	const [width, height] = [58, 36];
	const shape =
		section === 'rectangular'
			? box(x, y, width, height)
			: `M${x + height / 2} ${y}h${width - height}a${height / 2} ${height / 2} 0 0 1 0 ${height}h${height - width}a${height / 2} ${height / 2} 0 0 1 0 ${-height}z`;
	board
		.add('body', shape)
		.add('wall', shape)
		.dimension([x, y + height], [x + width, y + height], 'W', [0, 17])
		.dimension([x, y], [x, y + height], 'H', [-17, 0]);
}
