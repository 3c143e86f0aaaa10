import { findLeakageClass, leakageClasses, type LeakageClass } from '../leakage';

/** The leakage class of a key, `ATC6`, or of its printed name, `ATC 6`; or null. */
export function leakageClassOf(text: string): LeakageClass | null {
	return findLeakageClass(text) ?? leakageClasses.find(({ name }) => name === text) ?? null;
}
