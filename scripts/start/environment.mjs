/** What the server needs to know, for use on this machine. */

/**
 * @param {{ port: number, databaseUrl: string, authSecret: string, smtpUrl: string, inboxUrl: string }} of
 * @returns {Record<string, string>}
 */
export function serverEnvironment({ port, databaseUrl, authSecret, smtpUrl, inboxUrl }) {
	const origin = `http://localhost:${port}`;
	return {
		NODE_ENV: 'production',
		HOST: '127.0.0.1',
		PORT: String(port),
		ORIGIN: origin,
		AUTH_URL: origin,
		AUTH_TRUST_HOST: 'true',
		AUTH_SECRET: authSecret,
		DATABASE_URL: databaseUrl,
		SMTP_URL: smtpUrl,
		MAIL_FROM: 'Evendraft <evendraft@localhost>',
		MAIL_INBOX_URL: inboxUrl,
		BODY_SIZE_LIMIT: '16M',
		// Open sheets hold a connection each; they must not hold up a stop.
		SHUTDOWN_TIMEOUT: '2'
	};
}
