import pino from 'pino';

/** The server's log: one JSON line for each event on standard output. */
export const log = pino({ name: 'evendraft', level: process.env.LOG_LEVEL ?? 'info' });
