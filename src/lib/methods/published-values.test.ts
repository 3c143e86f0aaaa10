import { describe, expect, it } from 'vitest';
import { catalogue, evaluatedTopics, subjectsOfTopic } from '$lib/engine';
import { FORMULA_GROUPS } from '../components/site/methods/formulas';
import { figureText } from './axis';
import { publishedGroups, publishedTopics } from './published-values';

const PARTS = FORMULA_GROUPS.map(({ id }) => id);
const KEYS = catalogue.map(({ key }) => key);
const topics = [...publishedTopics().keys()].map((topic) => ({ topic }));

describe('the published figures of the method notes', () => {
	it.each(topics)('say of $topic what it speaks of', ({ topic }) => {
		const subjects = subjectsOfTopic(topic);
		expect(subjects.length).toBeGreaterThan(0);
		expect(subjects.filter((subject) => !KEYS.includes(subject) && !PARTS.includes(subject))).toEqual([]);
	});

	it.each(evaluatedTopics().map((topic) => ({ topic })))('have checks of $topic', ({ topic }) => {
		expect(publishedTopics().get(topic)).toBeGreaterThan(0);
	});

	it.each([...KEYS, ...PARTS].map((subject) => ({ subject })))(
		'of $subject are met within their tolerance, or say why nothing answers',
		({ subject }) => {
			for (const { values } of publishedGroups(subject))
				for (const { id, ours, isWithin, reason } of values) {
					if (ours === null) expect(reason, id).toMatch(/\w{3}/);
					else expect(isWithin, id).toBe(true);
				}
		}
	);

	it('stand beside the figure of the engine: the smooth elbow of r/D 1 by Idelchik is 0.21', () => {
		const values = publishedGroups('round-elbow-smooth').flatMap((group) => group.values);
		const one = values.find(({ given }) => given === 'θ 90°, r/D 1');
		expect(one).toMatchObject({ printed: '0.21', ours: '0.21', allowed: '±0.5 %', isWithin: true });
	});
});

describe('a figure in the notes', () => {
	it.each([
		[0.1, '0.1'],
		[-0.4941, '−0.4941'],
		[1.71608e-5, '1.71608 × 10⁻⁵'],
		[101325, '101325'],
		[3e8, '3 × 10⁸'],
		[0.1 + 0.2, '0.3']
	])('%d is %s', (value, text) => expect(figureText(value)).toBe(text));
});
