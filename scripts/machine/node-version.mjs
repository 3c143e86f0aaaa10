/**
 * Whether this Node.js can run Evendraft. Read before anything else, so it keeps to syntax and features that
 * an old Node.js knows, and imports nothing.
 */

/**
 * @param {string} version as in process.versions.node, e.g. '20.19.0'
 * @returns {string | null} one line for the reader, or null when the version will do
 */
export function nodeVersionProblem(version) {
	const parts = version.split('.').map(Number);
	const [major, minor] = parts;
	if (major > 20 ? major < 25 : major === 20 && minor >= 19) return null;
	return (
		'Evendraft needs Node.js 20.19 or later and below 25; this is ' +
		version +
		'. Install Node.js 20 (nodejs.org, or nodesource for Debian) and run the command again.'
	);
}
