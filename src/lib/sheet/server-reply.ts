import type { Solution } from '$lib/engine';
import type { LoggedEntry } from './entry';

/** What the route for edits answers. */
export interface EditsReply {
	readonly entries: readonly LoggedEntry[];
	readonly seq: number;
	readonly refused: readonly { readonly id: string; readonly reason: string }[];
	/** The server's own figures, which count; null when nothing can be computed. */
	readonly figures: ServerFigures | null;
	readonly problems: number;
}

export interface ServerFigures {
	readonly fan: Solution['fan'];
	readonly index: Solution['index'];
	readonly rows: number;
}
