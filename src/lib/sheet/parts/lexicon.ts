import type { Picture } from '$lib/engine';

/** What a word of the trade tells about a part. */
export type Role =
	| 'elbow'
	| 'junction'
	| 'leg'
	| 'straight'
	| 'shoe'
	| 'take-off'
	| 'wye'
	| 'cross'
	| 'bullhead'
	| 'chamber'
	| 'damper'
	| 'special-damper'
	| 'transition'
	| 'entry'
	| 'exit'
	| 'device'
	| 'mitred'
	| 'vaned'
	| 'splitter'
	| 'segmented'
	| 'smooth'
	| 'butterfly'
	| 'opposed'
	| 'parallel'
	| 'expansion'
	| 'contraction'
	| 'sudden'
	| 'gradual'
	| 'flush'
	| 'plain-end'
	| 'projecting'
	| 'bellmouth'
	| 'in-wall'
	| 'smaller'
	| 'larger'
	| 'plain';

export interface Word {
	readonly role: Role;
	/** As printed; '' for a word that is only glue. */
	readonly print: string;
	readonly picture: Picture | null;
}

const words = new Map<string, Word>();

function add(role: Role, picture: Picture | null, list: string) {
	for (const entry of list.split(' ')) {
		const [typed = '', print] = entry.split('=');
		words.set(typed, { role, picture, print: (print ?? typed).replaceAll('_', ' ') });
	}
}

// A word, or `abbreviation=what_is_printed` (nothing after `=` prints nothing). Common practice, spellings of both shores.
add('elbow', 'elbow', 'elbow elbows=elbow bend bends=bend ell=elbow ells=elbow e=elbow el=elbow');
add('junction', 'tee', 'tee tees=tee t=tee junction split');
add('leg', 'tee', 'branch br=branch b=branch');
add('straight', 'tee', 'straight through s=straight run');
add('shoe', 'shoe', 'shoe');
add('take-off', 'shoe', 'take-off takeoff=take-off tap');
add('wye', 'wye', 'wye y=wye');
add('cross', 'tee', 'cross');
add('bullhead', 'tee', 'bullhead');
add('chamber', null, 'plenum');
add('damper', 'damper', 'damper dampers=damper d=damper vcd=volume_damper vd=volume_damper mvd=volume_damper');
add(
	'special-damper',
	'firedamper',
	'fd=fire_damper fds=fire_damper sd=smoke_damper fsd=fire_and_smoke_damper fire smoke'
);
add(
	'special-damper',
	'damper',
	'backdraught backdraft=backdraught bdd=backdraught_damper nrd=non-return_damper non-return'
);
add(
	'transition',
	'transition',
	'transition transitions=transition reducer reducers=reducer rect-to-round offset tr=transition'
);
add('entry', 'transition', 'entry entries=entry entrance');
add('exit', 'transition', 'exit exits=exit');
add('device', 'silencer', 'silencer silencers=silencer attenuator attenuators=attenuator sil=silencer');
add('device', 'coil', 'coil coils=coil heater cooler humidifier recuperator exchanger');
add('device', 'filter', 'filter filters=filter');
add('device', 'louvre', 'louvre louvres=louvre louver=louvre cowl cowls=cowl screen mesh');
add('device', 'diffuser', 'diffuser diffusers=diffuser nozzle nozzles=nozzle');
add('device', 'grille', 'grille grilles=grille register valve valves=valve hood');
add('device', 'fan', 'fan');
add('device', 'flexible', 'connector connection flexible');
add('device', 'transition', 'box vav device equipment unit meter station orifice');

add('mitred', null, 'mitred mitre=mitred mitered=mitred miter=mitred square');
add('vaned', null, 'vaned vanes vane=vanes turning');
add('splitter', null, 'splitter splitters=splitter');
add('segmented', null, 'segmented gored=segmented lobster-back=segmented pieces= piece= gores= gore= segments= pc=');
add('smooth', null, 'smooth radius pressed');
add('butterfly', null, 'butterfly');
add('opposed', null, 'opposed opposed-blade=opposed_blade');
add('parallel', null, 'parallel parallel-blade=parallel_blade');
add('expansion', 'transition', 'expansion enlargement diverging-duct=expansion');
add('contraction', 'transition', 'contraction');
add('sudden', null, 'sudden abrupt=sudden');
add('gradual', null, 'gradual tapered=gradual conical');
add('flush', null, 'flush');
add('plain-end', null, 'end');
add('projecting', null, 'projecting');
add('bellmouth', 'transition', 'bellmouth bell-mouth=bellmouth');
add('in-wall', null, 'wall');
add('smaller', null, 'smaller=');
add('larger', null, 'larger=');
add(
	'plain',
	null,
	'way system effect volume control balancing manual motorised motorized=motorised open single double single-thickness double-thickness ' +
		'blade blades past main converging diverging long short weather roof exhaust supply return intake inlet outlet ' +
		'outdoor discharge suction ahu heating cooling heat recovery bag panel carbon duct air room wire bird insect terminal ' +
		'flow leg plain ceiling floor door transfer jet perforated egg-crate eggcrate=egg-crate round rectangular rect=rectangular oval hepa sound linear slot swirl disc spill and with of the in at for to + &'
);

export function findWord(typed: string): Word | null {
	return words.get(typed) ?? null;
}

/** Known words nearest to one that is not known, best first. */
export function nearestWords(typed: string, most = 3): string[] {
	return [...words.keys()]
		.filter((word) => word.length > 2 && words.get(word)?.role !== 'plain')
		.map((word) => ({ word, distance: distanceOf(typed.slice(0, 30), word) }))
		.sort((a, b) => a.distance - b.distance || (a.word < b.word ? -1 : 1))
		.slice(0, most)
		.map(({ word }) => word);
}

/** Letters to add, drop or change between two words. */
function distanceOf(a: string, b: string): number {
	let row = Array.from({ length: b.length + 1 }, (_, j) => j);
	for (let i = 1; i <= a.length; i += 1) {
		const next = [i];
		for (let j = 1; j <= b.length; j += 1) {
			const change = (row[j - 1] ?? 0) + (a[i - 1] === b[j - 1] ? 0 : 1);
			next.push(Math.min(change, (row[j] ?? 0) + 1, (next[j - 1] ?? 0) + 1));
		}
		row = next;
	}
	return row[b.length] ?? 0;
}
