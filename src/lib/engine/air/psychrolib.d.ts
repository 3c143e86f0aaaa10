// The package carries no types; only what the tests of this room use.
declare module 'psychrolib' {
	interface Psychrolib {
		readonly SI: number;
		SetUnitSystem(system: number): void;
		GetSatVapPres(t: number): number;
		GetStandardAtmPressure(z: number): number;
		GetHumRatioFromRelHum(t: number, phi: number, p: number): number;
		GetRelHumFromHumRatio(t: number, W: number, p: number): number;
		GetTDewPointFromVapPres(t: number, pw: number): number;
		GetMoistAirEnthalpy(t: number, W: number): number;
		GetTDryBulbFromEnthalpyAndHumRatio(h: number, W: number): number;
		GetMoistAirDensity(t: number, W: number, p: number): number;
	}
	const psychrolib: Psychrolib;
	export default psychrolib;
}
