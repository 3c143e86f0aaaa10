import { z } from 'zod';
import { sentEditSchema, type SentEdit } from './edit';

const key = (designId: string) => `evendraft/unsent/${designId}`;
const storedSchema = z.array(sentEditSchema);

/** Edits of a design that this device has not yet seen accepted; they outlive a reload and a closed browser. */
export function readKept(designId: string): SentEdit[] {
	try {
		const stored = storedSchema.safeParse(JSON.parse(localStorage.getItem(key(designId)) ?? '[]'));
		return stored.success ? stored.data : [];
	} catch {
		return [];
	}
}

/** Keeps the unsent edits; false when this device has no room for them. */
export function keep(designId: string, unsent: readonly SentEdit[]): boolean {
	try {
		if (unsent.length) localStorage.setItem(key(designId), JSON.stringify(unsent));
		else localStorage.removeItem(key(designId));
		return true;
	} catch {
		return false;
	}
}
