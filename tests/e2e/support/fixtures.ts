/** The documents and the demo that stand in fixtures/. */
import { readdirSync, readFileSync } from 'node:fs';
import type { SingleEdit } from '../../../src/lib/sheet/edit';
import type { FirmScope } from '../../../src/lib/server/auth/scope';
import { append, emptyDesign, rowsOf, sent, write } from '../../server/support/designs';

const read = (file: string): unknown => JSON.parse(readFileSync(`fixtures/${file}`, 'utf8'));

export interface Published {
	readonly of: readonly (string | number)[];
	readonly printed: number;
	readonly unit: string;
	readonly si_per_unit: number;
	readonly tolerance: { readonly relative?: number; readonly absolute?: number };
}

/** A worked system with the figures that its source printed. */
export interface Worked {
	readonly source: string;
	readonly published: readonly Published[];
}

export const worked = (name: string): Worked => read(`networks/${name}.json`) as Worked;

/** Every worked system as it stands: a document of the engine. */
export const networks = (): { name: string; document: unknown }[] =>
	readdirSync('fixtures/networks').map((name) => ({ name, document: read(`networks/${name}`) }));

interface DemoDesign {
	readonly name: string;
	readonly settings: Readonly<Record<string, string>>;
	readonly rows: readonly Readonly<Record<string, string>>[];
}
export const demoDesigns = (): readonly DemoDesign[] =>
	(read('demo/larkmoor.json') as { designs: DemoDesign[] }).designs;

/** A design of the demo, entered into a firm as typed text. */
export async function enterDemo(scope: FirmScope, { name, settings, rows }: DemoDesign): Promise<string> {
	const designId = await emptyDesign(scope, name);
	const edits = Object.entries(settings).map(([field, typed]) => write(null, field, typed) as SingleEdit);
	await append(scope, designId, [sent({ kind: 'batch', edits }), sent(rowsOf(rows).edit)]);
	return designId;
}
