import Papa from 'papaparse';
import { requirePerson, requireScope } from '$lib/server/auth/require';
import { download } from '$lib/server/http/download';
import { problem } from '$lib/server/http/problem';
import { printSchema, reportOfSheet } from '$lib/server/versions/report-of';
import type { RequestHandler } from './$types';

/** The duct schedule as a table for other programs, as shown on paper, in the design's units. */
export const GET: RequestHandler = async ({ locals, params, url }) => {
	const print = printSchema.parse(Object.fromEntries(url.searchParams));
	const person = requirePerson(locals);
	const report = await reportOfSheet(requireScope(locals), params.designId, print, person.name || person.email);
	if (report === null) return problem('not-found', 'No such design');
	if (report === 'no-answer') return problem('invalid', 'Mend the rows that do not count first.');
	const { columns, rows } = report.schedule;
	const head = columns.map(({ head, unit }) => (unit ? `${head} [${unit}]` : head));
	const csv = Papa.unparse([head, ...rows.map(({ cells }) => cells.map(({ text }) => plain(text)))], {
		escapeFormulae: FORMULA
	});
	return download(
		`\ufeff${csv}\r\n`,
		'text/csv; charset=utf-8',
		`${report.titleBlock.project} ${report.titleBlock.system}.csv`
	);
};

/** What spreadsheets would run as a formula; a figure below zero is none. */
const FORMULA = /^(?!-\d+(\.\d+)?$)[=+\-@\t\r]/;

/** Figures as programs read them: no grouping, a hyphen for minus, a blank for nothing. */
const plain = (text: string) =>
	text === '–' ? '' : text.replace(/(?<=\d)\u2009(?=\d{3})/g, '').replace(/^\u2212(?=\d)/, '-');
