import { readdirSync } from 'node:fs';

const ROUTES = 'src/routes';
/** Files that answer a request; layouts and error pages do not. */
const ANSWERS = /^\+(page(\.server)?\.(svelte|ts)|page@.*\.svelte|server\.ts)$/;

/** The ids of all routes that answer, as SvelteKit names them. */
export function routeIds(): string[] {
	const files = readdirSync(ROUTES, { recursive: true, withFileTypes: true });
	const folders = files.filter((file) => ANSWERS.test(file.name)).map((file) => file.parentPath.slice(ROUTES.length));
	return [...new Set(folders.map((folder) => folder || '/'))].sort();
}
