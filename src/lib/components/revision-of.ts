type Status = 'work-in-progress' | 'issued-for-review';

interface Saved {
	readonly revision: string;
	/** The last edit at which the sheet stood as it. */
	readonly standsAt: number;
	readonly status: Status;
}

/** What a title block says of a revision and of the status that goes with it. */
export interface Revision {
	readonly caption: string;
	readonly code: string;
	readonly about: string;
	readonly status: Status;
}

/** Of the working sheet: the last revision and its status while the sheet stands as saved; in work after it once edited. */
export function revisionOf(last: Saved | undefined, seq: number): Revision {
	if (!last) return { caption: 'Revision', code: '–', about: 'none saved yet', status: 'work-in-progress' };
	const { revision: code, status } = last;
	return seq > last.standsAt
		? { caption: 'In work, after', code, about: 'changed since', status: 'work-in-progress' }
		: { caption: 'Revision', code, about: 'as saved', status };
}
