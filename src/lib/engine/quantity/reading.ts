/** The units in which a person types and reads; what is stored is always SI. */
export type UnitSystem = 'SI' | 'IP';

/** What was understood from a typed text, or what is missing in it. */
export type Reading<T> =
	| {
			readonly ok: true;
			readonly value: T;
			/** What was understood, in full words. */
			readonly words: string;
			/** Why it was read so, where another reading was possible. */
			readonly why: string | null;
			/** The other plausible reading, as a text to type instead. */
			readonly other: string | null;
	  }
	| {
			readonly ok: false;
			/** What is missing or wrong; names what was typed. */
			readonly message: string;
			/** What was expected, with an example. */
			readonly expected: string;
	  };

/** Reads what a person typed into one cell. Never throws, whatever the text. */
export type Reader<T> = (text: string, units: UnitSystem) => Reading<T>;
