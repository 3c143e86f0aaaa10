export type Place = readonly [x: number, y: number];

/** Distance of a point from the line between two others. */
function distance([x, y]: Place, [x1, y1]: Place, [x2, y2]: Place): number {
	const length = Math.hypot(x2 - x1, y2 - y1);
	return length === 0 ? Math.hypot(x - x1, y - y1) : Math.abs((x2 - x1) * (y1 - y) - (x1 - x) * (y2 - y1)) / length;
}

/** The points of a line without those that lie within a distance of what is left, after Douglas and Peucker. */
export function simplified(points: readonly Place[], within: number): readonly Place[] {
	const [first, last] = [points[0], points[points.length - 1]];
	if (points.length < 3 || !first || !last) return points;
	let [most, at] = [0, 0];
	points.forEach((point, i) => {
		const away = distance(point, first, last);
		if (away > most) [most, at] = [away, i];
	});
	if (most <= within) return [first, last];
	return [...simplified(points.slice(0, at + 1), within), ...simplified(points.slice(at), within).slice(1)];
}
