import { readMeasure, type Measure } from './measure';
import * as measures from './measures';
import {
	cubicMetrePerSecond,
	degree,
	degreeCelsius,
	kilogramPerCubicMetre,
	metre,
	metrePerSecond,
	pascal,
	pascalPerMetre,
	ratio
} from './quantity';
import type { Reader } from './reading';

function reader<T>(measure: Measure, branded: (value: number) => T): Reader<T> {
	return (text, units) => {
		const reading = readMeasure(measure, text, units);
		return reading.ok ? { ...reading, value: branded(reading.value) } : reading;
	};
}

/** L/s in SI, cfm in IP, where no unit is typed. */
export const readFlow = reader(measures.FLOW, cubicMetrePerSecond);
/** m in SI, ft in IP; a whole number from 1000 up is mm in SI. */
export const readLength = reader(measures.LENGTH, metre);
/** As a length, of either sign: the far end less the fan end. */
export const readRise = reader(measures.RISE, metre);
/** m in SI, ft in IP. */
export const readElevation = reader(measures.ELEVATION, metre);
/** mm in SI, ft in IP. */
export const readRoughness = reader(measures.ROUGHNESS, metre);
/** Pa in SI, in. w.g. in IP; zero or more. */
export const readPressure = reader(measures.PRESSURE, pascal);
/** Pa in SI, in. w.g. in IP; gauge, of either sign. */
export const readRoomPressure = reader(measures.ROOM_PRESSURE, pascal);
/** Pa/m in SI, in. w.g. per 100 ft in IP. */
export const readRate = reader(measures.RATE, pascalPerMetre);
/** m/s in SI, fpm in IP. */
export const readVelocity = reader(measures.VELOCITY, metrePerSecond);
/** °C in SI, °F in IP. */
export const readTemperature = reader(measures.TEMPERATURE, degreeCelsius);
/** kg/m³ in SI, lb/ft³ in IP. */
export const readDensity = reader(measures.DENSITY, kilogramPerCubicMetre);
/** Percent, or below 1 a part of one; the value is 0 to 1. */
export const readHumidity = reader(measures.HUMIDITY, ratio);
/** Percent, or below 1 a part of one; the value is 0 to 0.6. */
export const readCompression = reader(measures.COMPRESSION, ratio);
/** Degrees, 0 to 180. */
export const readAngle = reader(measures.ANGLE, degree);
/** A plain number of either sign. */
export const readNumber = reader(measures.NUMBER, (value) => value);
