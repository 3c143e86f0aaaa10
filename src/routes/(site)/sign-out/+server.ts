import { signOut } from '$lib/server/auth/sign-in';
import type { RequestHandler } from './$types';

export const POST: RequestHandler = (event) => signOut(event);
