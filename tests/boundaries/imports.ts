/** The imports of every file of src, read from its text and resolved to files. */
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { dirname, join, normalize } from 'node:path';
import ts from 'typescript';

export interface Import {
	readonly from: string;
	readonly to: string;
	/** Gone at run time. */
	readonly typeOnly: boolean;
}

/** Every TypeScript and Svelte file below a folder, tests included. */
export const sourceFiles = (folder: string) =>
	readdirSync(folder, { recursive: true, encoding: 'utf8' })
		.filter((name) => /\.(ts|svelte)$/.test(name))
		.map((name) => join(folder, name))
		.sort();

/** The script of a file: of a component, what stands in its script elements. */
function scriptOf(file: string, text: string): string {
	if (!file.endsWith('.svelte')) return text;
	return [...text.matchAll(/<script[^>]*>([\s\S]*?)<\/script>/g)].map(([, script]) => script).join('\n');
}

/** What a text imports, as written. */
export function specifiersOf(file: string, text: string): { specifier: string; typeOnly: boolean }[] {
	const found: { specifier: string; typeOnly: boolean }[] = [];
	const take = (specifier: ts.Node | undefined, typeOnly: boolean) => {
		if (specifier && ts.isStringLiteralLike(specifier)) found.push({ specifier: specifier.text, typeOnly });
	};
	const visit = (node: ts.Node): void => {
		if (ts.isImportDeclaration(node)) take(node.moduleSpecifier, isTypeOnly(node.importClause));
		else if (ts.isExportDeclaration(node)) take(node.moduleSpecifier, node.isTypeOnly);
		else if (ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword)
			take(node.arguments[0], false);
		// A worker is a file of its own: `new URL('./worker.ts', import.meta.url)`.
		else if (ts.isNewExpression(node) && node.expression.getText() === 'URL') take(node.arguments?.[0], false);
		ts.forEachChild(node, visit);
	};
	visit(ts.createSourceFile(file, scriptOf(file, text), ts.ScriptTarget.Latest, true, ts.ScriptKind.TS));
	return found;
}

function isTypeOnly(clause: ts.ImportClause | undefined): boolean {
	if (!clause) return false;
	if (clause.phaseModifier === ts.SyntaxKind.TypeKeyword) return true;
	const named = clause.namedBindings;
	if (clause.name || !named || !ts.isNamedImports(named)) return false;
	return named.elements.length > 0 && named.elements.every((one) => one.isTypeOnly);
}

/** The file that a specifier means; null for a package, a file made by SvelteKit, or an asset. */
export function resolved(from: string, specifier: string): string | null {
	const path = specifier.startsWith('$lib/')
		? join('src/lib', specifier.slice(5))
		: specifier.startsWith('.')
			? normalize(join(dirname(from), specifier))
			: null;
	if (path === null) return null;
	const tried = [path, `${path}.ts`, `${path}/index.ts`, path.replace(/\.js$/, '.ts')];
	return tried.find((one) => existsSync(one) && statSync(one).isFile()) ?? null;
}

/** All imports between the files. */
export function importsOf(files: readonly string[]): Import[] {
	return files.flatMap((from) =>
		specifiersOf(from, readFileSync(from, 'utf8')).flatMap(({ specifier, typeOnly }) => {
			const to = resolved(from, specifier);
			return to === null ? [] : [{ from, to, typeOnly }];
		})
	);
}

/** The rings of a graph, each once: sets of places of which each leads to each other one. */
export function ringsOf(edges: readonly { readonly from: string; readonly to: string }[]): string[][] {
	const out = new Map<string, string[]>();
	for (const { from, to } of edges) out.set(from, [...(out.get(from) ?? []), to]);
	const number = new Map<string, number>();
	const lowest = new Map<string, number>();
	const open: string[] = [];
	const rings: string[][] = [];
	const visit = (place: string): number => {
		number.set(place, number.size);
		let low = number.get(place) ?? 0;
		open.push(place);
		for (const next of out.get(place) ?? [])
			if (!number.has(next)) low = Math.min(low, visit(next));
			else if (open.includes(next)) low = Math.min(low, number.get(next) ?? low);
		lowest.set(place, low);
		if (low !== number.get(place)) return low;
		const ring = open.splice(open.indexOf(place));
		if (ring.length > 1 || (out.get(place) ?? []).includes(place)) rings.push(ring.sort());
		return low;
	};
	for (const place of out.keys()) if (!number.has(place)) visit(place);
	return rings;
}
