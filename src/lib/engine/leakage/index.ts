export { findLeakageClass, leakageClasses, type LeakageClass } from './leakage-class';
export {
	LEAKAGE_PRESSURE,
	allowableLeakage,
	coefficientOfClass,
	leakageFlow,
	measuredClass,
	type Tightness
} from './leakage-flow';
