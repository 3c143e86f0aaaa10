const UNIQUE_VIOLATION = '23505';

/** Whether a query failed because a unique index holds the value already. Drizzle keeps the cause inside. */
export function isDuplicate(failure: unknown): boolean {
	const cause = failure instanceof Error ? (failure.cause ?? failure) : failure;
	return typeof cause === 'object' && cause !== null && 'code' in cause && cause.code === UNIQUE_VIOLATION;
}
