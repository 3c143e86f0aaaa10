import type { Content, TableCell } from 'pdfmake/interfaces';
import type { Report, ResultCell } from '$lib/report';
import { face, NARROW, SANS } from './fonts';
import { TINT } from './grid';
import { narrow, printable, sans } from './printable';

const VALUE = 15;
const UNIT = 9.75;
const LABEL = 8.6;
const PAD = 6.5;

/** The figures that count, in one tinted band, or in two where they would be crowded. */
export function resultBand({ cells }: Report['result'], width: number): Content {
	const natural = cells.map(naturalWidth);
	const whole = natural.reduce((sum, one) => sum + one, 0);
	if (whole <= width) return bandOf(cells, natural, width);
	const half = Math.ceil(cells.length / 2);
	return {
		stack: [
			bandOf(cells.slice(0, half), natural.slice(0, half), width),
			{ ...(bandOf(cells.slice(half), natural.slice(half), width) as object), margin: [0, -1.1, 0, 0] } as Content
		]
	};
}

function naturalWidth({ label, value, unit, aside }: ResultCell): number {
	const of = (text: string, size: number) => face(SANS, 'bold').widthOf(printable(text), size);
	const figure = of(`${value} `, VALUE) + of(aside ?? unit, UNIT);
	return Math.max(figure, face(NARROW, 'normal').widthOf(printable(label), LABEL)) + 2 * PAD + 2;
}

function bandOf(cells: readonly ResultCell[], natural: readonly number[], width: number): Content {
	const whole = natural.reduce((sum, one) => sum + one, 0);
	const scale = Math.max(1, width / whole);
	const fits = Math.min(1, width / whole);
	const body = cells.map(({ label, value, unit, aside }): TableCell => ({
		stack: [
			narrow(label, { fontSize: LABEL, color: '#333333' }),
			{
				text: [sans(value, { bold: true, fontSize: VALUE }), sans(`\u00a0${aside ?? unit}`, { fontSize: UNIT })],
				fontFeatures: ['tnum', 'case']
			}
		],
		fillColor: TINT
	}));
	return {
		table: {
			widths: natural.map((one) => one * scale * fits - 2 * (PAD - 1) - 0.7),
			body: [body]
		},
		layout: {
			hLineWidth: () => 1.1,
			vLineWidth: (i) => (i === 0 || i === cells.length ? 1.1 : 0.5),
			hLineColor: () => '#000000',
			vLineColor: (i) => (i === 0 || i === cells.length ? '#000000' : '#555555'),
			paddingLeft: () => PAD - 1,
			paddingRight: () => PAD - 1,
			paddingTop: () => 4.5,
			paddingBottom: () => 3
		}
	};
}
