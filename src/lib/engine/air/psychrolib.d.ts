// The package carries no types; only what the test of this room uses.
declare module 'psychrolib' {
	interface Psychrolib {
		readonly SI: number;
		SetUnitSystem(system: number): void;
		GetSatVapPres(t: number): number;
		GetStandardAtmPressure(z: number): number;
		GetHumRatioFromRelHum(t: number, phi: number, p: number): number;
		GetMoistAirDensity(t: number, W: number, p: number): number;
	}
	const psychrolib: Psychrolib;
	export default psychrolib;
}
