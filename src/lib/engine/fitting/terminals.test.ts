import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { describePublished } from '../../../../fixtures/published/published-checks';
import published from '../../../../fixtures/published/terminals.json';
import { ratedLoss } from './rated-loss';
import { terminalChecks } from '../published/terminals';

describePublished('terminals against published values', published, terminalChecks);

describe('the loss of a terminal', () => {
	it('is the rated one at the rated flow, whatever the exponent', () => {
		fc.assert(
			fc.property(fc.double({ min: 0.01, max: 5, noNaN: true }), fc.double({ min: 1, max: 2, noNaN: true }), (Q, n) => {
				expect(ratedLoss(40, Q, Q, n)).toBe(40);
			})
		);
	});

	it('takes the short way of a square to the same result', () => {
		expect(ratedLoss(30, 0.1, 0.07, 2)).toBeCloseTo(ratedLoss(30, 0.1, 0.07, 2 + 1e-12), 9);
		expect(ratedLoss(30, 0.1, 0, 1.4)).toBe(0);
	});
});
