import { problem } from './problem';

/** The JSON body of a request, or the refusal of one that is none or that is over the server's limit. */
export async function jsonBody(request: Request): Promise<{ body: unknown } | { refusal: Response }> {
	try {
		return { body: await request.json() };
	} catch (cause) {
		// The adapter ends the stream of a body that is too large with an error of this status.
		if (cause instanceof Error && 'status' in cause && cause.status === 413)
			return { refusal: problem('too-large', 'This is more than one message may hold.') };
		return { refusal: problem('malformed', 'This is not JSON.') };
	}
}
