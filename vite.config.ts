import { sveltekit } from '@sveltejs/kit/vite';
import { defineConfig } from 'vitest/config';

export default defineConfig({
	plugins: [sveltekit()],
	// Tailwind reads its own theme file at build time; bundled away it is not found.
	ssr: { noExternal: ['tailwindcss'] },
	worker: { format: 'es' },
	test: {
		reporters: ['default'],
		projects: [
			{
				extends: true,
				test: {
					name: 'unit',
					setupFiles: ['tests/support/properties.ts'],
					environment: 'node',
					include: ['src/**/*.test.ts', 'tests/boundaries/**/*.test.ts', 'scripts/**/*.test.mjs']
				}
			},
			{
				extends: true,
				test: {
					name: 'server',
					environment: 'node',
					include: ['tests/server/**/*.test.ts'],
					testTimeout: 30_000,
					hookTimeout: 60_000
				}
			},
			{
				extends: true,
				test: {
					name: 'e2e',
					environment: 'node',
					include: ['tests/e2e/**/*.test.ts'],
					testTimeout: 120_000,
					hookTimeout: 120_000,
					fileParallelism: false
				}
			}
		]
	}
});
