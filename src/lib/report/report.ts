import { basisOf } from './basis';
import { CALCULATION_AID, cautionsOf } from './cautions';
import { checksOf, criteriaOf } from './checks';
import { fanDutyOf } from './fan-duty';
import type { ReportInput } from './input';
import { ledgerOf } from './ledger';
import type { HeadingBlock, Report, RevisionLine, TitleBlock } from './model';
import { openItemsOf } from './open-items';
import { partsOf, remarksOf } from './parts';
import { resultOf } from './result';
import { scheduleOf } from './schedule';
import { sourcesOf } from './sources';
import { verificationOf } from './verification';
import { NOTHING, STATUS, dateOf, momentOf, orNothing, statusInWords } from './wording';

export type { ReportInput } from './input';
export type * from './model';

/**
 * The report of a design and its solution as plain data. Figures are those of the solution, in the units asked for and
 * with the digits of the screens; sums are of unrounded values. Reads its argument alone: the same input, the same report.
 */
export function reportOf(input: ReportInput): Report {
	const sources = sourcesOf(input);
	const remarks = remarksOf(input);
	return {
		paper: input.paper,
		printedAt: input.printedAt,
		units: input.units,
		heading: headingOf(input),
		titleBlock: titleBlockOf(input),
		basis: basisOf(input),
		result: resultOf(input),
		criteria: criteriaOf(input),
		toBeConfirmed: openItemsOf(input),
		checks: checksOf(input),
		schedule: scheduleOf(input),
		ledger: ledgerOf(input),
		parts: partsOf(input, sources, remarks),
		remarks,
		fan: fanDutyOf(input),
		cautions: cautionsOf(input),
		sources,
		revisions: revisionsOf(input),
		verification: verificationOf(input)
	};
}

function headingOf({ document, heading, revision, status, preparedBy, savedAt, printedAt }: ReportInput): HeadingBlock {
	const calculation = [heading.projectNumber, heading.system, revision ?? 'working sheet']
		.map((part) => part.trim())
		.filter((part) => part !== '')
		.join(' · ');
	return {
		kind: 'Calculation report',
		title: orNothing(document.title || heading.system),
		place: [heading.projectName, heading.place].filter((part) => part.trim() !== '').join(', '),
		identity: [
			{ label: 'Firm', value: orNothing(heading.firm) },
			{ label: 'Client', value: orNothing(heading.client) },
			{ label: 'Project', value: orNothing(`${heading.projectNumber} ${heading.projectName}`) },
			{ label: 'Calculation', value: orNothing(calculation) },
			{ label: 'Prepared', value: orNothing(preparedBy) },
			{ label: 'Saved', value: savedAt === null ? 'not saved: the working sheet' : momentOf(savedAt) },
			{ label: 'Printed', value: momentOf(printedAt) },
			{ label: 'Checked', value: NOTHING }
		],
		stamp: {
			lines: [STATUS[status].toUpperCase(), 'NOT FOR CONSTRUCTION'],
			caution: 'Software record of status only. Not a professional seal.'
		}
	};
}

function titleBlockOf({ heading, units, revision, status, savedAt, printedAt }: ReportInput): TitleBlock {
	return {
		firm: orNothing(heading.firm),
		project: orNothing(`${heading.projectNumber} ${heading.projectName}`),
		system: orNothing(heading.system),
		units,
		revision: revision ?? NOTHING,
		status: STATUS[status],
		date: dateOf(savedAt ?? printedAt),
		caution: CALCULATION_AID
	};
}

function revisionsOf({ revisions, revision }: ReportInput): RevisionLine[] {
	return revisions.map((one) => ({
		revision: orNothing(one.revision),
		date: dateOf(one.savedAt),
		status: statusInWords(one.status),
		note: orNothing(one.note),
		by: orNothing(one.by),
		current: one.revision === revision
	}));
}
