import { z } from 'zod';
import type { UnitSystem } from '$lib/engine';
import { reportOf, type Report, type ReportInput } from '$lib/report';
import { unitsOf } from '$lib/sheet/sheet';
import { solveSheet } from '$lib/sheet/solve-sheet';
import type { FirmScope } from '../auth/scope';
import { openDesign, type DesignHeading } from '../designs/find-design';
import { listVersions, openVersion, type VersionLine } from './versions';

export const printSchema = z.object({
	paper: z.enum(['A4', 'A3', 'Letter', 'Tabloid']).catch('A4'),
	units: z.enum(['SI', 'IP']).optional().catch(undefined)
});
export type Print = z.infer<typeof printSchema>;

type Input = Omit<ReportInput, 'paper' | 'units' | 'printedAt' | 'heading' | 'revisions'>;

function build(
	heading: DesignHeading,
	revisions: VersionLine[],
	units: UnitSystem,
	print: Print,
	input: Input
): Report {
	return reportOf({
		...input,
		heading: { ...heading, system: heading.name },
		units: print.units ?? units,
		paper: print.paper,
		printedAt: new Date().toISOString(),
		revisions: revisions.map(({ revision, savedAt, status, note, by }) => ({
			revision,
			savedAt: savedAt.toISOString(),
			status,
			note,
			by
		}))
	});
}

/** The report of the working sheet; 'no-answer' while nothing can be computed or a row does not count. */
export async function reportOfSheet(scope: FirmScope, designId: string, print: Print, preparedBy: string) {
	const opened = await openDesign(scope, designId);
	if (!opened) return null;
	const { document, solution, problems, uncounted } = solveSheet(opened.sheet);
	if (!document || !solution || problems.length || uncounted.length) return 'no-answer';
	return build(opened.heading, await listVersions(scope, designId), unitsOf(opened.sheet), print, {
		...{ revision: null, versionNumber: null, savedAt: null, sha256: null, note: null },
		...{ status: 'work-in-progress', preparedBy, document, solution }
	});
}

/** The report of a saved version, from its stored figures. */
export async function reportOfVersion(scope: FirmScope, designId: string, number: number, print: Print) {
	const saved = await openVersion(scope, designId, number);
	if (!saved) return null;
	const earlier = (await listVersions(scope, designId)).filter((line) => line.number <= number);
	return build(saved.heading, earlier, unitsOf(saved.sheet), print, {
		...{
			revision: saved.revision,
			versionNumber: saved.number,
			status: saved.status,
			sha256: saved.sha256,
			note: saved.note
		},
		...{
			savedAt: saved.savedAt.toISOString(),
			preparedBy: saved.by,
			document: saved.document,
			solution: saved.solution
		}
	});
}
