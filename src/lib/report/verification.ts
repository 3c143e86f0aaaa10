import type { ReportInput } from './input';
import type { Verification } from './model';

const DIGITS = 16;

/** How the paper can be held against what was saved: the first digits of the content hash, and what they are. */
export function verificationOf({ sha256, versionNumber, revision, solution }: ReportInput): Verification {
	const title = 'Does this paper match what was saved?';
	const engine = `engine ${solution.engineVersion}`;
	if (sha256 === null)
		return {
			title,
			text: 'This is a working sheet that was not saved as a version. Nothing can be held against it later; save a version before handing it over.',
			code: null,
			line: `No content hash · ${engine}`
		};
	const groups = sha256.slice(0, DIGITS).match(/.{1,4}/g) ?? [];
	return {
		title,
		text: `These are the first ${DIGITS} digits of the SHA-256 of the saved version’s content (document and solution). The version’s page in Evendraft shows the same ones if paper and record match.`,
		code: groups.join(' '),
		line: [
			...(versionNumber === null ? [] : [`Version ${versionNumber}`]),
			...(revision === null ? [] : [`revision ${revision}`]),
			engine
		].join(' · ')
	};
}
