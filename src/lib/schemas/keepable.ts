import { z } from 'zod';

/** A text that the database can keep: PostgreSQL takes no NUL, and no keyboard types one. */
export const keepable = () =>
	z.string().refine((text) => !text.includes('\0'), 'This holds a character that cannot be kept.');
