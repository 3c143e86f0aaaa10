import { z } from 'zod';
import { readElevation } from '$lib/engine';
import { keepable } from './keepable';

const line = (what: string, most: number) =>
	keepable().trim().min(1, `The project needs ${what}.`).max(most, `At most ${most} characters.`);
const optional = (most: number) => keepable().trim().max(most, `At most ${most} characters.`).default('');

/** A project as its form has it; the elevation as typed, in the units chosen beside it. */
export const projectSchema = z
	.object({
		number: line('a number', 40),
		name: line('a name', 120),
		client: optional(120),
		place: optional(120),
		elevation: optional(40),
		units: z.enum(['SI', 'IP']).default('SI')
	})
	.superRefine(({ elevation, units }, context) => {
		if (!elevation) return;
		const reading = readElevation(elevation, units);
		if (!reading.ok)
			context.addIssue({
				code: 'custom',
				path: ['elevation'],
				message: `${reading.message} Expected: ${reading.expected}.`
			});
	});

/** Metres above sea level of a form that was found valid; a blank is sea level. */
export function elevationOf({ elevation, units }: z.infer<typeof projectSchema>): number {
	const reading = elevation ? readElevation(elevation, units) : null;
	return reading?.ok ? reading.value : 0;
}

/** A new design of a project. */
export const designSchema = z.object({
	name: keepable().trim().min(1, 'The system needs a tag, as AHU-1.').max(40, 'At most 40 characters.'),
	service: keepable().trim().max(120, 'At most 120 characters.').default('')
});
