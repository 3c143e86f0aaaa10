import type { Config } from 'tailwindcss';

const token = (name: string) => `var(--${name})`;
const named = (...names: string[]) => Object.fromEntries(names.map((name) => [name, token(name)]));

/** The tokens of the look (src/tokens.css) under the names that classes use; nothing else stands beside them. */
export default {
	content: ['./src/**/*.{html,svelte,ts}'],
	darkMode: ['selector', ':root[data-theme="dark"]'],
	theme: {
		colors: {
			transparent: 'transparent',
			current: 'currentColor',
			...named(
				...['desk', 'sheet', 'tint', 'tint-2', 'well', 'ink', 'ink-2', 'ink-3', 'rule', 'rule-2', 'frame'],
				...[
					'select',
					'select-row',
					'focus',
					'index',
					'index-wash',
					'entered-ground',
					'computed-ground',
					'writing-line'
				],
				...['series-supply', 'series-return', 'series-exhaust', 'series-outdoor'],
				...['scale-short-3', 'scale-short-2', 'scale-short-1', 'scale-even'],
				...['scale-spare-1', 'scale-spare-2', 'scale-spare-3']
			)
		},
		fontFamily: { sans: token('font'), narrow: token('font-narrow') },
		fontSize: {
			caption: [token('fs-caption'), token('lh-caption')],
			small: [token('fs-small'), token('lh-small')],
			body: [token('fs-body'), token('lh-body')],
			read: [token('fs-read'), token('lh-read')],
			h3: [token('fs-h3'), '22px'],
			h2: [token('fs-h2'), '28px'],
			h1: [token('fs-h1'), '36px'],
			figure: [token('fs-figure'), '28px']
		},
		fontWeight: { text: '400', entered: '500', strong: '600', head: '700' },
		borderRadius: { none: '0' },
		boxShadow: { none: 'none', lift: token('shadow-lift') },
		borderWidth: { DEFAULT: '1px', 0: '0', hair: token('w-hair'), heavy: token('w-frame'), 2: '2px', 3: '3px' },
		transitionTimingFunction: { DEFAULT: token('ease') },
		transitionDuration: { DEFAULT: token('quick'), quick: token('quick'), settle: token('settle') },
		screens: { tablet: '700px', desk: '900px', wide: '1200px' },
		extend: {
			spacing: {
				row: token('row'),
				'row-loose': token('row-loose'),
				'row-touch': token('row-touch'),
				register: token('register'),
				tools: token('tools'),
				'title-block': token('block'),
				strip: token('margin-strip')
			}
		}
	}
} satisfies Config;
