import { isLiveMailToken } from '$lib/server/auth/mail-tokens';
import { verifyAddress } from '$lib/server/auth/verify-address';
import type { Actions, PageServerLoad } from './$types';

/** Uses nothing up: programs that read letters open their links, people press the button. */
export const load: PageServerLoad = async ({ url }) => {
	const token = url.searchParams.get('token') ?? '';
	return { token, live: await isLiveMailToken(token, 'verify-address') };
};

export const actions: Actions = {
	default: async ({ request }) => {
		const token = (await request.formData()).get('token');
		return { verified: typeof token === 'string' && (await verifyAddress(token)) };
	}
};
