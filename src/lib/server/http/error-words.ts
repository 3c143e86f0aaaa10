/** What the log keeps of an error: where it happened and which, never what people typed. */
interface ErrorWords {
	readonly type: string;
	readonly message: string;
	readonly code?: string;
	readonly stack: string;
	readonly cause?: ErrorWords;
}

/** A failed query carries its parameters in its message: typed texts, hashes of passwords, tokens. */
const isOfQuery = (error: Error) => 'query' in error || 'parameters' in error || /^Failed query/.test(error.message);

export function errorWords(error: unknown): ErrorWords {
	if (!(error instanceof Error)) return { type: typeof error, message: 'thrown, and no error', stack: '' };
	const frames = (error.stack ?? '').split('\n').filter((line) => /^\s+at /.test(line));
	const hidden = isOfQuery(error);
	const code = 'code' in error && typeof error.code === 'string' ? { code: error.code } : {};
	const cause = error.cause === undefined ? {} : { cause: errorWords(error.cause) };
	return {
		type: error.constructor.name,
		message: hidden ? 'a query failed' : error.message,
		...code,
		stack: frames.join('\n'),
		...cause
	};
}
