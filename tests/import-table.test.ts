/** The import table of DEVELOPERS.md, kept by ESLint: each forbidden way is refused, each allowed one is let through. */
import { fileURLToPath } from 'node:url';
import { ESLint } from 'eslint';
import { describe, expect, test } from 'vitest';

const eslint = new ESLint({
	cwd: fileURLToPath(new URL('../', import.meta.url)),
	overrideConfig: {
		// The snippets are not files, so the rules that ask for types can't look at them.
		languageOptions: { parserOptions: { projectService: false } },
		rules: {
			'@typescript-eslint/no-floating-promises': 'off',
			'@typescript-eslint/no-misused-promises': 'off',
			'@typescript-eslint/await-thenable': 'off',
			'@typescript-eslint/switch-exhaustiveness-check': 'off'
		}
	}
});

const IMPORT_RULES = [
	'@typescript-eslint/no-restricted-imports',
	'no-restricted-globals',
	'no-restricted-properties',
	'no-restricted-syntax'
];

async function refusals(filePath: string, code: string): Promise<string[]> {
	const script = filePath.endsWith('.svelte') ? `<script lang="ts">\n${code}\n</script>\n` : code;
	const [result] = await eslint.lintText(script, { filePath });
	const fatal = result?.messages.filter((message) => message.fatal) ?? [];
	expect(fatal).toEqual([]);
	return (result?.messages ?? [])
		.filter(({ ruleId }) => ruleId !== null && IMPORT_RULES.includes(ruleId))
		.map(({ message }) => message);
}

const uses = (from: string) => `import { x } from '${from}'; x(); `;
const usesType = (from: string) => `import type { X } from '${from}'; export type Y = X; `;

describe('refused', () => {
	test.each([
		['src/lib/physics/lines/a.ts', uses('zod'), 'physics says what is true'],
		['src/lib/physics/lines/a.ts', uses('../../widget/parse.ts'), 'physics says what is true'],
		['src/lib/physics/lines/a.ts', uses('$lib/physics/units/units.ts'), 'import by relative path'],
		['src/lib/physics/a.ts', usesType('../widget/document.ts'), 'physics says what is true'],
		['src/lib/physics/a.ts', 'export const a = Math.random();', 'The same inputs'],
		['src/lib/physics/formula/scan.ts', uses('mathjs/number'), 'physics says what is true'],
		['src/lib/physics/formula/parse.ts', uses('mathjs'), 'physics says what is true'],
		['src/lib/physics/house/build.ts', uses('../formula/parse.ts'), 'on the server alone'],
		['src/lib/widget/a.ts', uses('../physics/house/settle.ts'), 'on the server alone'],
		['src/lib/builder/a.ts', uses('$lib/physics/formula/parse.ts'), 'on the server alone'],
		['embed/frame.ts', uses('../src/lib/physics/house/settle.ts'), 'on the server alone'],
		['src/lib/widget/a.ts', 'export const a = window.innerWidth;', 'take it as an argument'],
		['src/lib/outlines/a.ts', uses('../factcheck/weigh.ts'), 'anyone could have written'],
		['src/lib/builder/a.ts', uses('../outlines/index.ts'), 'over HTTP'],
		['src/lib/widget/a.ts', uses('svelte'), 'the builder, the frame and the fact-check'],
		[
			'src/lib/widget/a.ts',
			uses('../factcheck/weigh.ts'),
			'the builder, the frame and the fact-check'
		],
		['src/lib/factcheck/a.ts', uses('../workflow/piece.ts'), 'on the copy and the reading alone'],
		['src/lib/workflow/a.ts', uses('../widget/parse.ts'), 'only types'],
		['src/lib/copy-lint/a.ts', uses('zod'), 'on the copy alone'],
		['src/lib/copy-lint/a.ts', uses('../factcheck/weigh.ts'), 'on the copy alone'],
		['src/lib/copy-lint/a.ts', 'export const a = document.title;', 'take it as an argument'],
		['src/lib/import/a.ts', uses('mammoth'), 'plain data about blocks'],
		['src/lib/import/a.ts', uses('$lib/import/b.ts'), 'import by relative path'],
		['src/lib/export/a.ts', uses('../builder/convert.ts'), 'the piece and its readings alone'],
		['src/lib/themes/a.ts', uses('../server/context.ts'), 'two colours and rules'],
		['src/lib/renderer/blocks/A.svelte', uses('$app/state'), 'reader’s frame'],
		['src/lib/renderer/blocks/A.svelte', uses('../../ui/Plate.svelte'), 'reader’s frame'],
		['src/lib/renderer/a.ts', uses('../widget/document.ts'), 'carries no zod'],
		['src/lib/renderer/a.ts', uses('../factcheck/beam.ts'), 'only types'],
		['src/lib/ui/A.svelte', uses('../widget/stated.ts'), 'no noun of the house'],
		['src/lib/ui/A.svelte', uses('../renderer/blocks/A.svelte'), 'no noun of the house'],
		['src/lib/builder/A.svelte', uses('$lib/server/context.ts'), 'over HTTP'],
		['src/lib/pictures/A.svelte', uses('../server/context.ts'), 'over HTTP'],
		['src/lib/pictures/a.ts', uses('../widget/parse.ts'), 'only types'],
		['src/lib/server/services/a.ts', uses('../../ui/Plate.svelte'), 'knows no screens'],
		['src/lib/server/services/a.ts', uses('../../renderer/Widget.svelte'), 'Only server/press'],
		['src/lib/server/services/a.ts', uses('$app/state'), 'a page in a browser'],
		['src/lib/server/services/a.ts', uses('$env/dynamic/private'), 'src/lib/server/env.ts'],
		['src/lib/server/services/a.ts', 'export const a = process.env.X;', 'src/lib/server/env.ts'],
		['src/routes/(desk)/a.ts', uses('../(public)/b.ts'), 'Routes never import from other routes'],
		['src/routes/(desk)/a.ts', uses('$env/static/private'), 'src/lib/server/env.ts'],
		['embed/frame.ts', uses('../src/lib/server/context.ts'), 'renderer, widget and physics only'],
		['embed/frame.ts', uses('../src/lib/widget/document.ts'), 'carries no zod']
	])('%s: %s', async (filePath, code, why) => {
		expect((await refusals(filePath, code)).join('\n')).toContain(why);
	});
});

describe('allowed', () => {
	test.each([
		['src/lib/physics/lines/a.ts', uses('../units/units.ts')],
		['src/lib/physics/formula/parse.ts', uses('mathjs/number') + uses('./scan.ts')],
		['src/lib/physics/house/settle.ts', uses('../formula/parse.ts')],
		['src/lib/server/services/a.ts', uses('../../physics/house/settle.ts')],
		['src/lib/widget/a.ts', uses('zod') + usesType('../physics/calculator.ts')],
		['src/lib/widget/a.ts', uses('diff')],
		['src/lib/widget/a.ts', uses('@noble/hashes/sha2.js') + uses('../errors.ts')],
		['src/lib/factcheck/a.ts', uses('../physics/units/units.ts') + usesType('../widget/stated.ts')],
		['src/lib/workflow/a.ts', uses('../errors.ts') + usesType('../factcheck/verdict.ts')],
		['src/lib/copy-lint/a.ts', uses('../widget/places.ts') + uses('./b.ts')],
		['src/lib/import/a.ts', uses('markdown-it') + uses('./b.ts')],
		['src/lib/export/a.ts', uses('../factcheck/judge.ts') + uses('../widget/places.ts')],
		['src/lib/builder/a.ts', uses('$lib/copy-lint/lint.ts') + uses('$lib/import/html-copy.ts')],
		['src/lib/forms/a.ts', uses('../themes/theme.ts')],
		['src/lib/renderer/A.svelte', uses('svelte/reactivity') + usesType('../widget/document.ts')],
		['src/lib/renderer/a.ts', uses('d3-scale') + usesType('../factcheck/beam.ts')],
		['src/lib/ui/A.svelte', uses('svelte') + uses('$lib/renderer/marks/Mark.svelte')],
		['src/lib/builder/a.ts', uses('prosemirror-state') + uses('$lib/factcheck/weigh.ts')],
		['src/lib/server/press/a.ts', uses('../../renderer/Widget.svelte')],
		[
			'src/lib/server/services/a.ts',
			uses('$lib/workflow/permissions.ts') + uses('../db/client.ts')
		],
		['src/routes/(desk)/a.ts', uses('$lib/server/context.ts') + uses('./b.ts')],
		['embed/serve.ts', uses('../src/lib/server/env.ts')],
		['embed/frame.ts', uses('../src/lib/renderer/Widget.svelte')]
	])('%s: %s', async (filePath, code) => {
		expect(await refusals(filePath, code)).toEqual([]);
	});
});
