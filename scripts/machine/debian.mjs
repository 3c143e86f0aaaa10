/** Debian's packages, through apt: as root, or with sudo when something really must be installed. */
import { accessSync, constants, writeFileSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { fullDisk, tellsOfFullDisk } from './disk.mjs';
import { LOGS } from './folders.mjs';
import { run } from './processes.mjs';
import { paint, Refusal, say } from './say.mjs';

/** @param {string} program @param {string} [path] @returns {string | null} where it is on the PATH */
export function onPath(program, path = process.env.PATH ?? '') {
	for (const folder of path.split(delimiter)) {
		try {
			accessSync(join(folder, program), constants.X_OK);
			return join(folder, program);
		} catch {
			// Not in this one.
		}
	}
	return null;
}

// Debian makes and starts a cluster of its own when a server is installed; that would take a port and memory for
// nothing. The setting lasts for this installation only.
const INSTALL = `set -e
export DEBIAN_FRONTEND=noninteractive
settings=/etc/postgresql-common/createcluster.d
file=$settings/evendraft-installs.conf
trap 'rm -f "$file"' EXIT
mkdir -p "$settings"
echo 'create_main_cluster = false' > "$file"
apt-get update -q
apt-get install -y -q --no-install-recommends -o DPkg::Lock::Timeout=120 "$@"
`;

/**
 * How apt can be called here.
 * @param {{ root: boolean, path?: string, terminal: boolean }} machine
 * @returns {{ before: string[] } | { missing: 'apt' | 'sudo' }}
 */
export function wayToApt({ root, path, terminal }) {
	if (!onPath('apt-get', path)) return { missing: 'apt' };
	if (root) return { before: [] };
	if (!onPath('sudo', path)) return { missing: 'sudo' };
	return { before: terminal ? ['sudo'] : ['sudo', '-n'] };
}

/**
 * Installs one package of Debian.
 * @param {string} name as apt knows it
 * @param {string} orElse what the reader can do instead, e.g. 'set DATABASE_URL'
 */
export async function installDebianPackage(name, orElse) {
	const terminal = Boolean(process.stdin.isTTY);
	const way = wayToApt({ root: process.getuid?.() === 0, terminal });
	if ('missing' in way)
		throw new Refusal(
			way.missing === 'apt'
				? `${name} is missing, and there is no apt on this machine: install ${name} by hand, or ${orElse}.`
				: `${name} is missing, and this user has no sudo: have 'apt-get install ${name}' run by the administrator, or ${orElse}.`
		);
	say(paint('dim', `  Installing Debian's ${name} (${way.before.length ? 'with sudo, ' : ''}a minute or so) …`));
	const [command, ...args] = [...way.before, 'sh', '-c', INSTALL, 'sh', name];
	const { code, output } = await run(command, args, { foreground: true, hold: true });
	writeFileSync(join(LOGS, `apt-${name}.log`), output);
	if (code === 0) return;
	if (tellsOfFullDisk(output)) throw fullDisk(`installing ${name}`);
	if (/sudo: .*(password|not allowed|not in the sudoers)/i.test(output))
		throw new Refusal(
			`${name} is missing, and sudo refused: have 'apt-get install ${name}' run by the administrator, or ${orElse}.`
		);
	const last = output.match(/^E: .*/gm)?.at(-1) ?? 'apt-get gave no reason';
	throw new Refusal(
		`${name} could not be installed (${last}; see .evendraft/log/apt-${name}.log): mend that, or ${orElse}.`
	);
}
