/** What the commands say: plain lines, and refusals of one line. */
import { styleText } from 'node:util';

// A closed terminal or pipe must not stop the tidying up.
process.stdout.on('error', () => {});
process.stderr.on('error', () => {});

/** Something that the reader can mend. The message is one line: what is wrong and what to do. */
export class Refusal extends Error {
	name = 'Refusal';
}

/** Thrown through the work in hand once a stop has been asked for. */
export class Interrupted extends Error {
	name = 'Interrupted';
}

const colourful = () =>
	process.stdout.isTTY && !process.env.CI && !process.env.NO_COLOR && process.env.FORCE_COLOR !== '0';

/** @param {import('node:util').InspectColor} style @param {string} text */
export const paint = (style, text) => (colourful() ? styleText(style, text) : text);

/** @param {string} [text] */
export function say(text = '') {
	process.stdout.write(text + '\n');
}

/**
 * One step and what came of it, in two columns.
 * @param {string} name
 * @param {string} outcome
 */
export function step(name, outcome) {
	say(`  ${paint('dim', name.padEnd(10))} ${outcome}`);
}

/** @param {string} text */
export function complain(text) {
	process.stderr.write(text + '\n');
}

/** @param {number} since milliseconds, from performance.now() */
export function seconds(since) {
	return `${((performance.now() - since) / 1000).toFixed(1)} s`;
}
