/** A published check as it was collected. */
export interface Check {
	readonly id: string;
	readonly topic: string;
	readonly inputs: Readonly<Record<string, unknown>>;
	readonly expected: unknown;
	readonly unit?: string;
	readonly tolerance: { readonly type: string; readonly value: number };
	readonly source: string;
	readonly certainty: string;
}

export interface PublishedFile {
	readonly checks?: readonly Check[];
	readonly notCovered?: readonly { readonly id: string; readonly reason: string }[];
	readonly printedShort?: readonly { readonly id: string; readonly halfUnit: number }[];
}

// The figures that the tests compare are shown too: they are data of the page, read here alone.
const byPath = import.meta.glob<PublishedFile>('/fixtures/published/*.json', { eager: true, import: 'default' });

export const publishedFiles: readonly PublishedFile[] = Object.values(byPath);
