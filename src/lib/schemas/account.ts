import { z } from 'zod';
import { newPassword, personName } from './sign-in';

export const nameSchema = z.object({ name: personName });

export const passwordSchema = z.object({ present: z.string().max(200).default(''), password: newPassword });

/** How the pages look: as the system does, or fixed. */
export const APPEARANCES = ['system', 'light', 'dark'] as const;
export type Appearance = (typeof APPEARANCES)[number];

export const appearanceSchema = z.object({ appearance: z.enum(APPEARANCES) });

export const sessionSchema = z.object({ sessionId: z.uuid() });
