import { describe, expect, it } from 'vitest';
import { blankOf } from './blank-of';

describe('what holds where a setting is left blank', () => {
	it('has its temperature and roughness in the units of the design', () => {
		expect(blankOf('temperature', 'SI')).toMatch(/^20(\.0)? °C$/);
		expect(blankOf('temperature', 'IP')).toMatch(/^68(\.0)? °F$/);
		expect(blankOf('material', 'SI')).toMatch(/0\.090? mm$/);
		expect(blankOf('material', 'IP')).toMatch(/0\.00030? ft$/);
	});

	it('is the words of the setting otherwise', () => {
		expect(blankOf('mainVelocity', 'IP')).toBe('not checked');
	});
});
