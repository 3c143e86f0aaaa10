import { Decimal } from './decimal';
import { termAt, type Term, type TermGrammar } from './term';
import type { UnitSystem } from './reading';
import { fromSI, toSI, type Unit } from './units';

/** The result of a sum; its value is in `unit`, or bare. */
export interface Sum extends Omit<Term, 'end'> {
	/** More than one term was typed. */
	readonly worked: boolean;
}

export type SumResult = { readonly ok: true; readonly sum: Sum } | { readonly ok: false; readonly message: string };

/** Why a text is no sum; caught by `readSum` alone. */
class NotASum extends Error {}

/**
 * A term, or after `=` a sum of terms with + - * / and brackets. A bare term takes the unit of the one it is
 * added to (`=1200-460 cfm`); feet and inches are added in inches, so that nothing is lost.
 *
 * @param text plain text, at most some hundred characters
 */
export function readSum(text: string, grammar: TermGrammar, units: UnitSystem): SumResult {
	try {
		return { ok: true, sum: new SumReader(text, grammar, units).whole() };
	} catch (reason) {
		if (reason instanceof NotASum) return { ok: false, message: reason.message };
		throw reason;
	}
}

class SumReader {
	private at = 0;
	private terms = 0;

	constructor(
		private readonly text: string,
		private readonly grammar: TermGrammar,
		private readonly units: UnitSystem
	) {}

	whole(): Sum {
		const worked = this.take('=');
		const sum = worked ? this.added() : this.signed();
		this.blank();
		if (this.at < this.text.length) this.refuseRest(worked);
		return { ...sum, worked: this.terms > 1 };
	}

	private refuseRest(worked: boolean): never {
		const rest = this.text.slice(this.at).trim();
		if (!worked && /^[+\-*/(]/.test(rest)) throw new NotASum('a sum starts with an equals sign');
		throw new NotASum(`“${rest}” is not understood`);
	}

	private added(): Sum {
		let left = this.multiplied();
		for (;;) {
			if (this.take('+')) left = this.plus(left, this.multiplied(), 1);
			else if (this.take('-')) left = this.plus(left, this.multiplied(), -1);
			else return left;
		}
	}

	private multiplied(): Sum {
		let left = this.signed();
		for (;;) {
			if (this.take('*') || this.take('x')) left = this.times(left, this.signed());
			else if (this.take('/')) left = this.over(left, this.signed());
			else return left;
		}
	}

	private signed(): Sum {
		if (this.take('+')) return this.signed();
		if (this.take('-')) {
			const sum = this.signed();
			return { ...sum, value: sum.value.negated(), bareInteger: false };
		}
		if (this.take('(')) {
			const inner = this.added();
			if (!this.take(')')) throw new NotASum('a bracket is not closed');
			return inner;
		}
		const term = termAt(this.text, this.at, this.grammar, this.units);
		if (!term) {
			const rest = this.text.slice(this.at).trim();
			throw new NotASum(rest === '' ? 'a figure is missing at the end' : `“${rest}” is not a figure`);
		}
		this.at = term.end;
		this.terms += 1;
		return { ...term, worked: false };
	}

	private plus(left: Sum, right: Sum, sign: 1 | -1): Sum {
		const unit = commonUnit(left, right);
		return joined(left, right, unit, inUnit(left, unit).plus(inUnit(right, unit).times(sign)));
	}

	private times(left: Sum, right: Sum): Sum {
		if (left.unit && right.unit) throw new NotASum('two figures with units cannot be multiplied');
		return joined(left, right, left.unit ?? right.unit, left.value.times(right.value));
	}

	private over(left: Sum, right: Sum): Sum {
		if (right.unit) throw new NotASum('a sum divides by a plain figure, without a unit');
		if (right.value.isZero()) throw new NotASum('the sum divides by zero');
		return joined(left, right, left.unit, left.value.div(right.value));
	}

	private take(sign: string): boolean {
		this.blank();
		if (this.text[this.at] !== sign) return false;
		this.at += 1;
		return true;
	}

	private blank() {
		while (this.text[this.at] === ' ') this.at += 1;
	}
}

function commonUnit(left: Sum, right: Sum): Unit | null {
	const unit = left.unit ?? right.unit;
	if (unit === null) return null;
	if (unit.zero !== '0') throw new NotASum('temperatures with units cannot be added');
	if ((left.compound && !right.unit) || (right.compound && !left.unit)) {
		throw new NotASum('beside feet and inches each figure needs its unit');
	}
	return unit;
}

function inUnit(sum: Sum, unit: Unit | null): Decimal {
	return unit === null || sum.unit === null || sum.unit === unit ? sum.value : fromSI(toSI(sum.value, sum.unit), unit);
}

function joined(left: Sum, right: Sum, unit: Unit | null, value: Decimal): Sum {
	const compound = left.compound || right.compound;
	// A sum of whole figures is read as the whole figure that it is.
	const bareInteger = left.bareInteger && right.bareInteger && value.isInteger();
	return { value, unit, compound, bareInteger, doubt: left.doubt ?? right.doubt, worked: true };
}
