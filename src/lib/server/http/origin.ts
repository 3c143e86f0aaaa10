/**
 * The address under which the application is reached, from AUTH_URL or ORIGIN. Letters and redirects are built from
 * it and never from headers, which any client may set.
 */
export function origin(): string {
	const address = process.env.AUTH_URL || process.env.ORIGIN;
	if (!address) throw new Error('AUTH_URL or ORIGIN must be set to the address of the application');
	return new URL(address).origin;
}
