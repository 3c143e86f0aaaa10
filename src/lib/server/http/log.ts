import pino from 'pino';
import { errorWords } from './error-words';

/** The server's log: one JSON line for each event on standard output. */
export const log = pino({
	name: 'evendraft',
	level: process.env.LOG_LEVEL ?? 'info',
	serializers: { err: errorWords }
});
