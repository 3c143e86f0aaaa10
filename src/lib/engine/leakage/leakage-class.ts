/** How tight a ductwork is: the leakage of a square metre of its surface at a static pressure p is c p^0.65. */
export interface LeakageClass {
	readonly key: string;
	readonly name: string;
	/** c [m3/(s m2 Pa^0.65)] */
	readonly coefficient: number;
	/** What its standard is written for */
	readonly shapes: readonly ('round' | 'rectangular')[];
	readonly source: string;
	readonly caution: string | null;
}

const EN = 'EN 1507 (rectangular) and EN 12237 (round)';
const ATC = 'EN 16798-3, air tightness classes';
const LIMITS_READ = "limits read in a maker's page on air tightness";
const BOTH = ['round', 'rectangular'] as const;

/** c is printed in L/(s m2 Pa^0.65). */
function leakageClass(key: string, name: string, litres: number, source: string, caution: string | null = null) {
	return { key, name, coefficient: litres / 1000, shapes: BOTH, source: `${source}; ${LIMITS_READ}`, caution };
}

const UNTESTED = 'A class for ductwork that is not tested: an assumption for the design, no limit of a test.';

/** Classes by key, from the leakiest; inch-pound classes CL are numbers and need no list. */
export const leakageClasses: readonly LeakageClass[] = [
	leakageClass('ATC6', 'ATC 6', 0.0675, ATC, UNTESTED),
	leakageClass('ATC5', 'ATC 5', 0.027, `${ATC}; the same as class A`),
	leakageClass('A', 'Class A', 0.027, EN),
	leakageClass('ATC4', 'ATC 4', 0.009, `${ATC}; the same as class B`),
	leakageClass('B', 'Class B', 0.009, EN),
	leakageClass('ATC3', 'ATC 3', 0.003, `${ATC}; the same as class C`),
	leakageClass('C', 'Class C', 0.003, EN),
	leakageClass('ATC2', 'ATC 2', 0.001, `${ATC}; the same as class D`),
	leakageClass('D', 'Class D', 0.001, EN),
	leakageClass('ATC1', 'ATC 1', 0.00033, ATC)
];

const byKey: ReadonlyMap<string, LeakageClass> = new Map(leakageClasses.map((one) => [one.key, one]));

/** The class of a key, or null. */
export function findLeakageClass(key: string): LeakageClass | null {
	return byKey.get(key) ?? null;
}
