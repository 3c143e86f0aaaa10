import { z } from 'zod';

/**
 * A text on one line that the database can keep: PostgreSQL takes no NUL, and no keyboard types one. Breaks of a line
 * become blanks, since a record on paper has one line for it.
 */
export const keepable = () =>
	z
		.string()
		.refine((text) => !text.includes('\0'), 'This holds a character that cannot be kept.')
		.overwrite((text) => text.replace(/\s+/g, ' '));
