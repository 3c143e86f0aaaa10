import { error } from '@sveltejs/kit';
import type { PageServerLoad } from './$types';

/** What the guard shows for an address that is unknown or not the visitor's. */
export const load: PageServerLoad = () => error(404, 'Not found');
