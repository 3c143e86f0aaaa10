// The very bits of some results: a change of one is a change of every solution kept so far.
import { describe, expect, it } from 'vitest';
import { asin, atan, cos, exp, log, log10, pow, sin, tan } from '.';

function bitsOf(x: number): string {
	const view = new DataView(new ArrayBuffer(8));
	view.setFloat64(0, x);
	return view.getBigUint64(0).toString(16).padStart(16, '0');
}

const cases: readonly (readonly [string, number])[] = [
	['log(0.1)', log(0.1)],
	['log(7)', log(7)],
	['log(123456.789)', log(123456.789)],
	['log10(2)', log10(2)],
	['log10(0.0003)', log10(0.0003)],
	['exp(1)', exp(1)],
	['exp(-9.7)', exp(-9.7)],
	['exp(0.3)', exp(0.3)],
	['pow(0.5, 0.5)', pow(0.5, 0.5)],
	['pow(0.7, 0.625)', pow(0.7, 0.625)],
	['pow(0.966, 5.2559)', pow(0.966, 5.2559)],
	['pow(40000, -0.19)', pow(40_000, -0.19)],
	['sin(0.8)', sin(0.8)],
	['cos(2.5)', cos(2.5)],
	['tan(1.2)', tan(1.2)],
	['asin(0.3)', asin(0.3)],
	['atan(0.7)', atan(0.7)]
];

describe('the bits of elementary functions', () => {
	it('stay as they are', () => {
		expect(Object.fromEntries(cases.map(([name, value]) => [name, bitsOf(value)]))).toMatchInlineSnapshot(`
			{
			  "asin(0.3)": "3fd380159e14f6ff",
			  "atan(0.7)": "3fe38b112d7bd4ad",
			  "cos(2.5)": "bfe9a2f7ef858b7d",
			  "exp(-9.7)": "3f1010aa6d9b69c8",
			  "exp(0.3)": "3ff599058c8c1a96",
			  "exp(1)": "4005bf0a8b145769",
			  "log(0.1)": "c0026bb1bbb55515",
			  "log(123456.789)": "40277281cad8a844",
			  "log(7)": "3fff2272ae325a57",
			  "log10(0.0003)": "c00c2edb0d360540",
			  "log10(2)": "3fd34413509f79ff",
			  "pow(0.5, 0.5)": "3fe6a09e667f3bcc",
			  "pow(0.7, 0.625)": "3fe99b0d9c752f0e",
			  "pow(0.966, 5.2559)": "3feaae2a595577da",
			  "pow(40000, -0.19)": "3fc117cf9119166c",
			  "sin(0.8)": "3fe6f494c2bffecd",
			  "tan(1.2)": "400493c43acb164c",
			}
		`);
	});
});
