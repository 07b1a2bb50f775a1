import { expect, test } from 'vitest';
import { embedSnippet, reservedHeight } from './embed-snippet.ts';
import { firstLight } from './server/demo/first-light.ts';

const release = { origin: 'https://w.varrowmere.example', slug: 'first-light-on-the-dial' };

test('the snippet is an iframe in a sandbox and a plain link, without script', () => {
	const snippet = embedSnippet({ ...release, document: firstLight });
	expect(snippet).toContain('src="https://w.varrowmere.example/w/first-light-on-the-dial/latest"');
	expect(snippet).toContain('sandbox="allow-scripts allow-popups allow-popups-to-escape-sandbox"');
	expect(snippet).toContain('<a href="https://w.varrowmere.example/w/first-light-on-the-dial">');
	expect(snippet).toContain('loading="lazy"');
	expect(snippet).not.toMatch(/<script|allow-same-origin|on\w+=/);
});

test('a title can’t break out of its attribute', () => {
	const title = '"><script>alert(1)</script>&';
	const snippet = embedSnippet({ ...release, document: { ...firstLight, title } });
	expect(snippet).not.toContain('<script>');
	expect(snippet).toContain('&quot;&gt;&lt;script&gt;alert(1)&lt;/script&gt;&amp;');
});

test('longer copy keeps more room, and a narrow frame more than a wide one', () => {
	const [, wide = 0, narrow = 0] =
		/clamp\((\d+)px,.*,(\d+)px\)/.exec(reservedHeight(firstLight))?.map(Number) ?? [];
	expect(narrow).toBeGreaterThan(wide);
	const longer = {
		...firstLight,
		blocks: [
			...firstLight.blocks,
			{
				id: 'more',
				kind: 'paragraph' as const,
				content: [{ kind: 'text' as const, text: 'More. '.repeat(80) }]
			}
		]
	};
	const [, longerWide = 0] = /clamp\((\d+)px/.exec(reservedHeight(longer))?.map(Number) ?? [];
	expect(longerWide).toBeGreaterThan(wide);
});
