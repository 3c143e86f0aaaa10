import { z } from 'zod';
import { keepable } from './keepable';
import { SETTING_READERS } from '$lib/sheet/fields';
import { SETTING_NAMES } from '$lib/sheet/setting-names';

const typed = keepable().trim().max(200, 'At most 200 characters.').default('');
const FIELDS = Object.keys(SETTING_NAMES) as (keyof typeof SETTING_NAMES)[];

/** The basis of design as its form has it: the system's names, every setting as typed, and the units they were typed in. */
export const basisSchema = z
	.object({
		name: keepable().trim().min(1, 'The system needs a tag, as AHU-1.').max(40, 'At most 40 characters.'),
		serves: keepable().trim().max(120, 'At most 120 characters.').default(''),
		typedIn: z.enum(['SI', 'IP']).default('SI'),
		...(Object.fromEntries(FIELDS.map((field) => [field, typed])) as Record<(typeof FIELDS)[number], typeof typed>)
	})
	.superRefine((form, context) => {
		for (const field of FIELDS) {
			const reading = form[field] ? SETTING_READERS[field](form[field], form.typedIn) : null;
			if (reading && !reading.ok)
				context.addIssue({
					code: 'custom',
					path: [field],
					message: `${reading.message} Expected: ${reading.expected}.`
				});
		}
	});

export const BASIS_FIELDS = FIELDS;
