import { describe, expect, it } from 'vitest';
import { STANDARD_DENSITY, STANDARD_DENSITY_IP, actualFlow, airState, standardFlow } from '.';

describe('a flow of standard air', () => {
	it('is the flow itself in standard air', () => {
		expect(actualFlow(2, 1.204)).toBe(2);
		expect(actualFlow(2, STANDARD_DENSITY_IP, STANDARD_DENSITY_IP)).toBe(2);
	});

	it('is more in lighter air, of the same mass', () => {
		const { density } = airState({ temperature: 35, elevation: 1500 });
		const flow = actualFlow(2, density);
		expect(flow).toBeGreaterThan(2);
		expect(flow * density).toBeCloseTo(2 * STANDARD_DENSITY, 12);
		expect(standardFlow(flow, density)).toBeCloseTo(2, 12);
	});

	it('has the densities of both practices', () => {
		// Dry air of 20 °C has 1.2041, of 70 °F 1.1996; 0.075 lb/ft3 is 1.2014 (reference A4).
		expect(STANDARD_DENSITY).toBeCloseTo(airState({ temperature: 20 }).density, 3);
		expect(STANDARD_DENSITY_IP).toBeCloseTo(1.2014, 4);
	});
});
