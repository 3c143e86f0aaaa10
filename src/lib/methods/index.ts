/** The method notes: what is computed, from where, and how it compares with what is published. Plain data for the page. */
export { entryNote, familyNotes, type EntryNote, type FamilyNotes } from './entry-notes';
export { plottedParameter } from './fitting-plot';
export { methodName } from './method-name';
export type { Plot, PlotCurve, Tick } from './plot';
export { publishedGroups, publishedTopics, type PublishedGroup, type PublishedValue } from './published-values';
