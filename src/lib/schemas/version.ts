import { z } from 'zod';
import { keepable } from './keepable';

/** What a person says of a version that they save. */
export const saveVersionSchema = z.object({
	note: keepable().trim().min(1, 'Say in a few words what changed.').max(400, 'At most 400 characters.'),
	status: z.enum(['work-in-progress', 'issued-for-review']).default('work-in-progress')
});
