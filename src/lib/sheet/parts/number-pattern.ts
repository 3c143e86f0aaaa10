/**
 * A figure with a point or a comma, or without, from its first digit on: a pattern that may begin anywhere in a run of
 * digits takes time by the cube of its length.
 */
export const NUMBER = '(?<!\\d)(?:\\d+(?:[.,]\\d+)?|[.,]\\d+)';
/** The same in a group, also below zero. */
export const SIGNED_NUMBER = `(-?${NUMBER})`;
