export * from './quantity';
export type { Reader, Reading, UnitSystem } from './reading';
export * from './readers';
export { readSize } from './read-size';
export { unitOf, type QuantityName } from './columns';
export {
	formatAngle,
	formatArea,
	formatCoefficient,
	formatDensity,
	formatElevation,
	formatFlow,
	formatHumidity,
	formatLength,
	formatMass,
	formatPower,
	formatPressure,
	formatQuantity,
	formatRate,
	formatRoughness,
	formatSize,
	formatTemperature,
	formatVelocity,
	formatViscosity,
	type FigureName,
	type Shown
} from './format';
export { editSize, editText } from './edit-text';
export { plainSigns, plainText, quoted, refusal, sentence } from './plain-text';
