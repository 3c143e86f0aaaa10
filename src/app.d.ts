import type { Appearance } from '$lib/schemas/account';
import type { FirmScope } from '$lib/server/auth/scope';

declare global {
	namespace App {
		interface Error {
			message: string;
			/** Under which the server's log has the cause. */
			id?: string;
		}
		interface Locals {
			/** Who is signed in. */
			person: { readonly id: string; readonly email: string; readonly name: string } | null;
			/** Proof that the person belongs to the current firm; from the database at each request. */
			scope: FirmScope | null;
			/** The firm that the person works in at present. */
			firm: { readonly firmId: string; readonly name: string } | null;
			/** The session of this browser. */
			sessionId: string | null;
			/** Light or dark, when the person fixed it. */
			appearance: Appearance;
		}
	}
}

export {};
