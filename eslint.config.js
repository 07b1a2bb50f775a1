import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import svelte from 'eslint-plugin-svelte';
import globals from 'globals';
import ts from 'typescript-eslint';
import svelteConfig from './svelte.config.js';

/**
 * The import table: who may import whom, and why not otherwise. `own` names folders and files of `src/lib`; `types` those
 * of which only types may come; `packages` are patterns of package names. DEVELOPERS.md has the same table as prose.
 */
const OWN = [
	'physics',
	'widget',
	'factcheck',
	'workflow',
	'outlines',
	'copy-lint',
	'import',
	'export',
	'renderer',
	'builder',
	'vetting',
	'pictures',
	'typeset',
	'themes',
	'galley',
	'ui',
	'forms',
	'api',
	'server',
	'errors',
	'routes'
];
const PURE = ['physics', 'widget', 'factcheck', 'workflow', 'copy-lint', 'import', 'export'];

const TABLE = {
	physics: {
		own: [],
		packages: [],
		why: 'physics says what is true: it knows no document, no page and no server'
	},
	widget: {
		own: ['physics', 'errors'],
		packages: ['zod', '@noble/hashes', 'diff'],
		why: 'a document and what follows from it must come out the same in the builder, the frame and the fact-check'
	},
	factcheck: {
		own: ['physics', 'widget'],
		packages: [],
		why: 'a verdict depends on the copy and the reading alone, never on who asks or where'
	},
	workflow: {
		own: ['errors'],
		types: ['widget', 'factcheck'],
		packages: [],
		why: 'permissions and states are decided from plain facts, so that services and pages can ask the same function'
	},
	'copy-lint': {
		own: ['widget'],
		packages: [],
		why: 'a note on the copy depends on the copy alone'
	},
	import: {
		own: [],
		packages: ['markdown-it'],
		why: 'an import is plain data about blocks, whoever asks for it'
	},
	export: {
		own: ['physics', 'widget', 'factcheck'],
		packages: [],
		why: 'what is printed of a piece depends on the piece and its readings alone'
	},
	outlines: {
		own: ['physics', 'widget'],
		packages: [],
		why: 'an outline is a document that anyone could have written'
	},
	forms: {
		own: ['widget', 'workflow', 'errors', 'physics', 'themes'],
		packages: ['zod'],
		why: 'a form is a schema that the page and the service share'
	},
	api: {
		own: ['physics', 'widget', 'workflow', 'errors'],
		packages: ['zod'],
		why: 'the shapes of the public JSON are schemas and nothing else'
	},
	renderer: {
		own: ['physics', 'widget'],
		types: ['factcheck'],
		packages: ['svelte', 'd3-[a-z]+'],
		why: 'the reader’s frame is built from the renderer alone and carries all that it imports'
	},
	ui: {
		own: [],
		only: ['renderer/marks', 'renderer/tokens'],
		packages: ['svelte', 'katex/dist/katex\\.min\\.css', '\\$app/(state|navigation|forms|paths)'],
		why: 'the plain parts of a page know no noun of the house'
	},
	vetting: {
		own: ['ui', 'forms', 'workflow', 'physics', 'errors', 'routes'],
		packages: ['svelte', 'sveltekit-superforms', 'idb-keyval', '\\$app/(state|navigation|forms)'],
		why: 'writing and vetting a calculator happens in a browser: it reaches the server over HTTP'
	},
	pictures: {
		own: ['ui', 'errors', 'routes'],
		types: ['widget'],
		packages: ['zod', 'svelte'],
		why: 'the picture desk happens in a browser: it reaches the server over HTTP and knows no document but the block it fills'
	},
	typeset: {
		own: ['renderer', 'pictures', 'physics', 'routes'],
		packages: ['svelte', 'katex'],
		why: 'equations are set on the server for readers and in the browser for the office, by one function'
	},
	themes: {
		own: ['renderer', 'ui', 'forms', 'widget', 'physics', 'errors', 'routes'],
		packages: ['svelte', 'sveltekit-superforms', '\\$app/(state|navigation|forms)'],
		why: 'a theme is two colours and rules, and is written in a browser: it reaches the server over HTTP'
	},
	galley: {
		own: ['renderer', 'typeset', 'ui', 'widget', 'physics', 'errors', 'routes'],
		packages: ['svelte', 'axe-core$'],
		why: 'the galley looks at the drawn frame in a browser: it asks the server for nothing'
	},
	builder: {
		own: [
			'copy-lint',
			'import',
			'export',
			'pictures',
			'typeset',
			'renderer',
			'vetting',
			'ui',
			'forms',
			'factcheck',
			'workflow',
			'widget',
			'physics',
			'errors',
			'routes'
		],
		packages: ['svelte', 'prosemirror-[a-z]+', 'idb-keyval', '\\$app/(state|navigation|forms)'],
		why: 'the builder runs in a writer’s browser: it reaches the server over HTTP and draws with the renderer'
	}
};

const escape = (/** @type {string} */ text) => text.replace(/[$.*+?^(){}|[\]\\/]/g, '\\$&');
const own = (/** @type {string[]} */ names) =>
	`^(?:(?:\\.\\./)+|\\$lib/)(?:${names.join('|')})(?:/|\\.ts$)`;

const NO_ENV = {
	regex: '^\\$env/',
	message: 'Settings are read and checked in one place: src/lib/server/env.ts.'
};

/** What parses formulas carries a parser from a package; trees are all that anything in a browser needs. */
const NO_PARSER = {
	regex: '(?:^|/)(?:formula/parse|house/settle)\\.ts$',
	allowTypeImports: true,
	message:
		'Formulas are parsed on the server alone, when they are saved: call the service, or work with the tree.'
};

/**
 * @param {keyof typeof TABLE} folder
 * @param {{ files: string[], packages: string[] }} [parsing] Files of the folder that parse formulas.
 */
function mayImport(folder, parsing) {
	const {
		own: allowed,
		types = [],
		only = [],
		packages,
		why
	} = {
		types: undefined,
		only: undefined,
		...TABLE[folder]
	};
	const foreign = OWN.filter(
		(name) => name !== folder && !allowed.includes(name) && !types.includes(name)
	);
	const except = only.map((path) => `(?!(?:(?:\\.\\./)+|\\$lib/)${escape(path)})`).join('');
	const patterns = [
		{
			regex: `^(?!\\.{1,2}/|\\$lib/|(?:${[...packages, ...(parsing?.packages ?? []), 'node:never'].join('|')})(?:/|$))`,
			message: `src/lib/${folder} may not import this package: ${why}.`
		},
		{
			regex: `${except}${own(foreign)}`,
			message: `src/lib/${folder} may not import this folder: ${why}.`
		}
	];
	if (!parsing) patterns.push(NO_PARSER);
	if (types.length > 0) {
		patterns.push({
			regex: own(types),
			allowTypeImports: true,
			message: `src/lib/${folder} may take only types from here: ${why}.`
		});
	}
	if (PURE.includes(folder) || folder === 'renderer') {
		patterns.push({
			regex: '^\\$lib/',
			message: `src/lib/${folder} is also built outside SvelteKit (frame, command line): import by relative path.`
		});
	}
	if (folder === 'renderer') {
		patterns.push({
			regex:
				'(?:^|/)widget/(?:document|block|chart|control|formula-step|language|references|parse|upgrades)\\.ts$',
			allowTypeImports: true,
			message: 'The frame carries no zod: take only types from the document’s schema.'
		});
	}
	return {
		files: parsing?.files ?? [`src/lib/${folder}/**/*.{ts,svelte}`],
		ignores: ['**/*.test.ts'],
		rules: { '@typescript-eslint/no-restricted-imports': ['error', { patterns }] }
	};
}

const NO_COMPONENT = {
	regex: '\\.svelte$',
	message: 'The server draws no pages; only server/press may render, to freeze a release.'
};
const SERVER = [
	NO_ENV,
	{
		regex: '^\\$app/(?:state|stores|navigation|forms)$',
		message: 'This belongs to a page in a browser.'
	},
	{
		regex: own(['builder', 'vetting', 'ui']),
		message: 'The server knows no screens: src/lib/server gives data, src/routes shows it.'
	},
	{
		regex: '(?:^|/)src/routes/|^(?:\\.\\./)+routes/',
		message: 'Routes call services, never the other way round.'
	}
];
const NO_RENDERER = {
	regex: own(['renderer']),
	allowTypeImports: true,
	message: 'Only server/press may use the renderer, to freeze a release.'
};

const DOM = [
	'window',
	'document',
	'navigator',
	'location',
	'localStorage',
	'sessionStorage',
	'indexedDB',
	'fetch'
];

export default ts.config(
	{
		ignores: ['build/', '.svelte-kit/', 'node_modules/', 'data/', 'drizzle/', 'static/']
	},
	js.configs.recommended,
	...ts.configs.recommended,
	...svelte.configs.recommended,
	prettier,
	...svelte.configs.prettier,
	{
		languageOptions: { globals: { ...globals.node, ...globals.browser } },
		linterOptions: { reportUnusedDisableDirectives: 'error' },
		rules: {
			// TypeScript knows the names better.
			'no-undef': 'off',
			'no-console': 'error',
			'no-empty': ['error', { allowEmptyCatch: false }],
			eqeqeq: ['error', 'always', { null: 'ignore' }],
			'@typescript-eslint/consistent-type-imports': [
				'error',
				{ fixStyle: 'separate-type-imports' }
			],
			'@typescript-eslint/no-explicit-any': 'error',
			'@typescript-eslint/ban-ts-comment': 'error',
			'@typescript-eslint/no-unused-vars': [
				'error',
				{ argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true }
			],
			'@typescript-eslint/no-restricted-imports': ['error', { patterns: [NO_ENV] }]
		}
	},
	{
		files: ['**/*.svelte', '**/*.svelte.ts'],
		languageOptions: {
			parserOptions: { parser: ts.parser, extraFileExtensions: ['.svelte'], svelteConfig }
		},
		rules: {
			// Links come from src/lib/routes.ts, and the app is served at the root of its host.
			'svelte/no-navigation-without-resolve': 'off',
			'svelte/no-at-html-tags': 'error',
			'svelte/button-has-type': 'error',
			'svelte/no-target-blank': ['error', { allowReferrer: true }],
			// A space at the edge of a block is kept only when it is written so.
			'svelte/no-useless-mustaches': 'off',
			// It can't tell a working Map inside a function from one that is state.
			'svelte/prefer-svelte-reactivity': 'off'
		}
	},
	{
		// Rules that need types: for code whose promises matter.
		files: ['src/**/*.ts', 'embed/**/*.ts', 'tests/**/*.ts'],
		ignores: ['**/*.svelte.ts'],
		languageOptions: {
			parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname }
		},
		rules: {
			'@typescript-eslint/no-floating-promises': 'error',
			'@typescript-eslint/no-misused-promises': [
				'error',
				{ checksVoidReturn: { arguments: false } }
			],
			'@typescript-eslint/await-thenable': 'error',
			'@typescript-eslint/only-throw-error': 'off',
			'@typescript-eslint/switch-exhaustiveness-check': [
				'error',
				{ considerDefaultExhaustiveForUnions: true }
			]
		}
	},

	...Object.keys(TABLE).map((folder) => mayImport(/** @type {keyof typeof TABLE} */ (folder))),
	mayImport('physics', {
		files: ['src/lib/physics/formula/parse.ts'],
		packages: ['mathjs/number$']
	}),
	mayImport('physics', { files: ['src/lib/physics/house/settle.ts'], packages: [] }),
	{
		files: PURE.map((folder) => `src/lib/${folder}/**/*.ts`),
		ignores: ['**/*.test.ts'],
		rules: {
			'no-restricted-globals': [
				'error',
				...[...DOM, 'process', 'Buffer'].map((name) => ({
					name,
					message:
						'The pure folders run in a browser, in Node and in tests alike: take it as an argument.'
				}))
			],
			'no-restricted-properties': [
				'error',
				{
					object: 'Math',
					property: 'random',
					message: 'The same inputs must give the same answer.'
				},
				{ object: 'Date', property: 'now', message: 'Take the time as an argument.' }
			]
		}
	},
	{
		files: ['src/lib/server/**/*.ts'],
		ignores: ['**/*.test.ts', 'src/lib/server/press/**'],
		rules: {
			'@typescript-eslint/no-restricted-imports': [
				'error',
				{ patterns: [...SERVER, NO_COMPONENT, NO_RENDERER] }
			]
		}
	},
	{
		files: ['src/lib/server/press/**/*.ts'],
		ignores: ['**/*.test.ts'],
		rules: { '@typescript-eslint/no-restricted-imports': ['error', { patterns: SERVER }] }
	},
	{
		files: ['src/routes/**/*.{ts,svelte}'],
		rules: {
			'@typescript-eslint/no-restricted-imports': [
				'error',
				{
					patterns: [
						NO_ENV,
						NO_PARSER,
						{
							regex: '^\\.\\./(?!.*\\.css$)',
							message:
								'Routes never import from other routes: what two share has a home in src/lib.'
						},
						{
							regex: '^\\$app/stores$',
							message: 'Use $app/state.'
						}
					]
				}
			]
		}
	},
	{
		files: ['embed/**/*.ts'],
		// The server's entry and the build's own steps stand here too, and are no part of the frame.
		ignores: ['embed/{serve,server,signs,press-manifest}.ts', 'embed/*.config.ts', '**/*.test.ts'],
		rules: {
			'@typescript-eslint/no-restricted-imports': [
				'error',
				{
					patterns: [
						NO_PARSER,
						{
							regex: '^\\$(?:app|env)/',
							message: 'The reader’s frame is built outside SvelteKit.'
						},
						{
							regex: '/lib/(?:factcheck|workflow|forms|api|ui|builder|server)/|/src/routes/',
							allowTypeImports: true,
							message:
								'The reader’s frame carries all that it imports: renderer, widget and physics only.'
						},
						{
							regex: '/lib/widget/(?:document|parse|upgrades)\\.ts$',
							allowTypeImports: true,
							message: 'The frame carries no zod: take only types from the document’s schema.'
						}
					]
				}
			]
		}
	},
	{
		files: ['src/**/*.{ts,svelte}', 'embed/**/*.ts'],
		ignores: ['**/*.test.ts', 'src/cli/**', 'src/lib/server/env.ts', 'embed/*.config.ts'],
		rules: {
			'no-restricted-syntax': [
				'error',
				{
					selector: "MemberExpression[object.name='process'][property.name='env']",
					message: 'Settings are read and checked in one place: src/lib/server/env.ts.'
				}
			]
		}
	},
	{
		// Equations of our own calculators, set by src/lib/server/typeset.ts; reviewed.
		files: ['src/lib/ui/Equation.svelte'],
		rules: { 'svelte/no-at-html-tags': 'off' }
	},
	{
		// Commands talk to the person who runs them.
		files: ['src/cli/**', 'tests/support/**'],
		rules: { 'no-console': 'off' }
	}
);
