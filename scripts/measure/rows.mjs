/** Rows of a made-up building as a person would type them: a riser, mains on its floors, three run-outs from each piece. */

const SIZES = ['900x600', '800x500', '700x450', '600x400', '500x350', '400x300', '350x250', '300x200'];

/** @param {number} count @returns {Record<string, string>[]} */
export function typedRows(count) {
	/** @type {Record<string, string>[]} */
	const rows = [];
	const add = (/** @type {Record<string, string>} */ row) => void (rows.length < count && rows.push(row));
	let below = '';
	for (let floor = 0; rows.length < count; floor++) {
		const riser = `R${floor}`;
		add({ tag: riser, joins: below, size: '1200x900', length: '4.2', parts: 'elbow r1.0 C0.23, fire damper 8 Pa' });
		below = riser;
		let before = riser;
		for (let piece = 0; piece < SIZES.length; piece++) {
			const main = `${riser}M${piece}`;
			add({ tag: main, joins: before, size: SIZES[piece] ?? '', length: '6.5', parts: 'straight way C0.1' });
			before = main;
			for (let out = 0; out < 3; out++)
				add({
					...{ tag: `${main}-${out}`, joins: main, serves: `Room ${floor}.${piece}${out}`, flow: `${40 + 5 * out}` },
					...{ size: 'Ø160', length: '3.5', flex: '1.2', parts: 'shoe C0.6, elbow r1.0 C0.23, VCD C0.2', outlet: '20' }
				});
		}
	}
	return withOutlets(rows);
}

/** Where the count cut the building short, an outlet closes the end. @param {Record<string, string>[]} rows */
function withOutlets(rows) {
	const joined = new Set(rows.map(({ joins }) => joins));
	return rows.map((row) => (joined.has(row.tag) || row.flow ? row : { ...row, flow: '50', outlet: '20' }));
}
