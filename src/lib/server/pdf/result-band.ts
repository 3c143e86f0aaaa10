import type { Content, TableCell } from 'pdfmake/interfaces';
import type { Report, ResultCell } from '$lib/report';
import { face, NARROW, SANS } from './fonts';
import { TINT } from './grid';
import { narrow, printable, sans } from './printable';

const VALUE = 15;
const UNIT = 9.75;
const LABEL = 8.6;
const PAD = 6.5;
/** Of the figures, where that keeps them in one band. */
const SMALLER = 0.85;

/** The figures that count, in one tinted band, or in two where they would be crowded. */
export function resultBand({ cells }: Report['result'], width: number): Content {
	const natural = cells.map((one) => naturalWidth(one, 1));
	const whole = sum(natural);
	if (whole <= width) return bandOf(cells, natural, width, 1);
	const smaller = cells.map((one) => naturalWidth(one, SMALLER));
	if (sum(smaller) <= width) return bandOf(cells, smaller, width, SMALLER);
	const half = Math.ceil(cells.length / 2);
	const even = (some: readonly ResultCell[]) =>
		bandOf(
			some,
			some.map(() => 1),
			width,
			1
		);
	return { stack: [even(cells.slice(0, half)), { stack: [even(cells.slice(half))], margin: [0, -1.1, 0, 0] }] };
}

const sum = (values: readonly number[]) => values.reduce((total, one) => total + one, 0);

function naturalWidth({ label, value, unit, aside }: ResultCell, scale: number): number {
	const of = (text: string, size: number) => face(SANS, 'bold').widthOf(printable(text), size * scale);
	const figure = of(`${value} `, VALUE) + of(aside ?? unit, UNIT);
	return Math.max(figure, face(NARROW, 'normal').widthOf(printable(label), LABEL)) + 2 * PAD + 2;
}

function bandOf(cells: readonly ResultCell[], natural: readonly number[], width: number, scale: number): Content {
	const share = width / sum(natural);
	const body = cells.map(({ label, value, unit, aside }): TableCell => ({
		stack: [
			narrow(label, { fontSize: LABEL, color: '#333333' }),
			{
				text: [
					sans(value, { bold: true, fontSize: VALUE * scale }),
					sans(`\u00a0${aside ?? unit}`, { fontSize: UNIT * scale })
				],
				fontFeatures: ['tnum', 'case']
			}
		],
		fillColor: TINT
	}));
	return {
		table: { widths: natural.map((one) => one * share - 2 * (PAD - 1) - 0.7), body: [body] },
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
