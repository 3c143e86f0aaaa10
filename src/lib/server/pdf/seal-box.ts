import type { Content, ContentTable } from 'pdfmake/interfaces';
import type { Verification } from '$lib/report';
import { STRONG } from './fonts';
import { footOrigin, isShort, type Sheet } from './paper';
import { narrow, sans } from './printable';

const heightOn = (sheet: Sheet) => (isShort(sheet) ? 76 : 100);
/** Height that the foot of the cover takes above the title block [pt]. */
export const coverFootHeight = (sheet: Sheet): number => heightOn(sheet) + 8;
const SEAL = 240;
const GAP = 20;

/** At the foot of the cover: the hash of what was saved, and an empty box for a professional's own seal. */
export function coverFoot(sheet: Sheet, { title, text, code, line }: Verification): Content {
	const { left, width } = sheet.content;
	const height = heightOn(sheet);
	const top = sheet.blockTop - height - 9 - footOrigin(sheet);
	const sealLeft = left + width - SEAL;
	const start = sheet.wide ? left + (width + 34) / 2 : left;
	const room = sealLeft - GAP - start;
	const lines: Content[] = [
		sans(title, { fontSize: 10.5, bold: true }),
		sans(text, { fontSize: 9, margin: [0, 2, 0, 0] })
	];
	const told = sans(line, { fontSize: 9, color: '#333333' });
	if (code === null) lines.push({ ...told, margin: [0, 4, 0, 0] });
	else {
		const box: ContentTable = {
			table: {
				widths: ['auto'],
				body: [
					[sans(code, { font: STRONG, fontSize: 13.5, characterSpacing: 0.7, noWrap: true, fontFeatures: ['tnum'] })]
				]
			},
			layout: {
				hLineWidth: () => 0.75,
				vLineWidth: () => 0.75,
				paddingLeft: () => 6,
				paddingRight: () => 6,
				paddingTop: () => 2,
				paddingBottom: () => 2
			}
		};
		lines.push({
			columns: [
				{ width: 'auto', ...box },
				{ width: '*', ...told }
			],
			columnGap: 8,
			margin: [0, 4, 0, 0]
		});
	}
	const dash = { length: 2.2, space: 1.6 };
	return {
		stack: [
			{ columns: [{ width: room, stack: lines }], absolutePosition: { x: start, y: top } },
			{
				canvas: [{ type: 'rect', x: 0, y: 0, w: SEAL, h: height, lineWidth: 0.75, dash }],
				absolutePosition: { x: sealLeft, y: top }
			},
			{
				columns: [{ width: SEAL - 16, ...sans('Professional’s own signature, seal and date', { fontSize: 9.4 }) }],
				absolutePosition: { x: sealLeft + 8, y: top + 5 }
			},
			{
				columns: [
					{
						width: SEAL - 16,
						...narrow('Left empty by the program. Nothing printed here is a seal or certification.', {
							fontSize: 8.6,
							color: '#333333'
						})
					}
				],
				absolutePosition: { x: sealLeft + 8, y: top + height - 16 }
			}
		]
	};
}
