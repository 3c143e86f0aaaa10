type Inputs = Readonly<Record<string, unknown>>;

/** Inputs of a published check, read by name; a missing or mistyped one fails the check. */
export class Given {
	constructor(private readonly inputs: Inputs) {}

	number(name: string): number {
		const value = this.inputs[name];
		if (typeof value !== 'number') throw new Error(`${name} is no number of this check`);
		return value;
	}

	text(name: string): string {
		const value = this.inputs[name];
		if (typeof value !== 'string') throw new Error(`${name} is no text of this check`);
		return value;
	}

	/** The rows of a table, each a list of texts and numbers. */
	rows(name: string): readonly (readonly unknown[])[] {
		const value = this.inputs[name];
		if (!Array.isArray(value) || !value.every(Array.isArray)) throw new Error(`${name} is no table of this check`);
		return value;
	}

	isText(name: string): boolean {
		return typeof this.inputs[name] === 'string';
	}

	has(name: string): boolean {
		return name in this.inputs;
	}
}

/** What a check asks for: one figure, or several by name. */
export type Answer = number | Readonly<Record<string, number | readonly number[]>>;

/** Works out a published check from its inputs, by topic. */
export type Evaluators = Readonly<Record<string, (given: Given) => Answer>>;
