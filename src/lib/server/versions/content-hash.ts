import { createHash } from 'node:crypto';
import { canonicalText } from '$lib/engine';

/** SHA-256, hexadecimal, of the canonical form of what a version holds. */
export function contentHash(content: { document: unknown; solution: unknown; engineVersion: string }): string {
	return createHash('sha256').update(canonicalText(content), 'utf8').digest('hex');
}
