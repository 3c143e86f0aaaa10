/**
 * Where a text stops being JSON, in words: `expected a value at line 3, column 12`.
 * The text is scanned here, for the messages of JSON.parse differ from one engine to the next.
 */
export function whereJsonBreaks(text: string): string {
	const scan = new Scan(text);
	const expected = scan.document();
	const before = text.slice(0, scan.at).split('\n');
	const column = (before.at(-1)?.length ?? 0) + 1;
	return `expected ${expected ?? 'JSON'} at line ${before.length}, column ${column}`;
}

const SPACE = /[ \t\r\n]*/y;
const TEXT = /"(?:[^"\\\r\n\t]|\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4}))*"/y;
const PLAIN = /-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?(?![\w.])|(?:true|false|null)(?!\w)/y;

/** A walk along the text with the open brackets kept in a list, so that no nesting is too deep. */
class Scan {
	at = 0;

	constructor(private readonly text: string) {}

	/** What was expected where the walk stopped; null at the end of sound JSON. */
	document(): string | null {
		const open: ('{' | '[')[] = [];
		for (;;) {
			const inner = this.opened();
			if (inner !== null) {
				open.push(inner);
				if (!this.takes(inner === '{' ? '}' : ']')) {
					const fault = inner === '{' ? this.key() : null;
					if (fault !== null) return fault;
					continue;
				}
				open.pop();
			} else if (!this.matches(TEXT) && !this.matches(PLAIN)) return 'a value';
			for (;;) {
				const around = open.at(-1);
				if (around === undefined) return this.ended() ? null : 'the end';
				const closing = around === '{' ? '}' : ']';
				if (this.takes(',')) {
					const fault = around === '{' ? this.key() : null;
					if (fault !== null) return fault;
					break;
				}
				if (!this.takes(closing)) return `a comma or ${closing}`;
				open.pop();
			}
		}
	}

	private key(): string | null {
		if (!this.matches(TEXT)) return 'a key in double quotes';
		return this.takes(':') ? null : 'a colon';
	}

	private opened(): '{' | '[' | null {
		if (this.takes('{')) return '{';
		return this.takes('[') ? '[' : null;
	}

	private takes(sign: string): boolean {
		this.skipSpace();
		if (this.text[this.at] !== sign) return false;
		this.at += 1;
		return true;
	}

	private matches(pattern: RegExp): boolean {
		this.skipSpace();
		pattern.lastIndex = this.at;
		const found = pattern.exec(this.text);
		if (found === null) return false;
		this.at += found[0].length;
		return true;
	}

	private ended(): boolean {
		this.skipSpace();
		return this.at === this.text.length;
	}

	private skipSpace(): void {
		SPACE.lastIndex = this.at;
		this.at += SPACE.exec(this.text)?.[0].length ?? 0;
	}
}
