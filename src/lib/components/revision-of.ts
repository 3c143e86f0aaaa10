interface Saved {
	readonly revision: string;
	/** The last edit that is in it. */
	readonly seq: number;
}

/** What the title block says of the last revision: whether the working sheet still is as it was saved. */
export function revisionOf(last: Saved | undefined, seq: number): { readonly code: string; readonly about: string } {
	if (!last) return { code: '–', about: 'none saved yet' };
	return { code: last.revision, about: seq > last.seq ? 'edited since' : 'as saved' };
}
