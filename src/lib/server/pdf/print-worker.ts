import type { Report } from '$lib/report';
import { reportPdf } from './report-pdf';

/** Where this very file lies once the server is built; TypeScript, which a thread cannot read, before that. */
export const FILE = import.meta.url;

/** Prints on a thread of its own: a long report takes seconds, in which the server would answer nobody. */
export default async function print(report: Report): Promise<Uint8Array> {
	return reportPdf(report);
}
