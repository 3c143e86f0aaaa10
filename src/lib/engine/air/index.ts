export { airAtTemperature, type AirCondition } from './air-at-temperature';
export { airState, type AirSpec, type AirState } from './air-state';
export { AIR_PRESSURE, AIR_TEMPERATURE, RELATIVE_HUMIDITY, humidAirDensity } from './humid-air-density';
export { SATURATION_TEMPERATURE, saturationPressure } from './saturation-pressure';
export { ELEVATION, standardPressure, standardTemperature } from './standard-atmosphere';
export { velocityPressure } from './velocity-pressure';
export { VISCOSITY_TEMPERATURE, sutherlandViscosity } from './viscosity';
