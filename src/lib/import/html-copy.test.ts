import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { copyFromHtml } from './html-copy.ts';
import type { ImportedBlock } from './imported-copy.ts';
import { copyFromText } from './text-copy.ts';

const words = ({ content }: ImportedBlock) =>
	content
		.map(({ text, marks = [] }) =>
			marks.reduce((inner, mark) => `<${mark}>${inner}</${mark}>`, text)
		)
		.join('');
const lines = (html: string) =>
	copyFromHtml(html).blocks.map((block) => `${block.kind}: ${words(block)}`);
const notes = (html: string) => copyFromHtml(html).notes;

describe('what a word processor puts on the clipboard', () => {
	test('a head full of styles, conditional comments and empty paragraphs', () => {
		const html = `<html xmlns:o="urn:schemas-microsoft-com:office:office"><head><meta charset=utf-8>
<!--[if gte mso 9]><xml><o:OfficeDocumentSettings/></xml><![endif]--><style><!-- p.MsoNormal {margin:0} --></style></head>
<body lang=EN-GB><!--StartFragment--><p class=MsoNormal style='margin-bottom:8.0pt'><span lang=EN-GB>Cold
hydrogen sends <i>one</i> note<span style='mso-spacerun:yes'>  </span>at <b>1420&nbsp;MHz</b>.<o:p></o:p></span></p>
<p class=MsoNormal><o:p>&nbsp;</o:p></p><h2>The stretch<o:p></o:p></h2><!--EndFragment--></body></html>`;
		expect(lines(html)).toEqual([
			'paragraph: Cold hydrogen sends <em>one</em> note at <strong>1420\u00a0MHz</strong>.',
			'heading: The stretch'
		]);
	});

	test('looks given by style, and a wrapper that is bold in name only', () => {
		expect(
			lines(
				'<b style="font-weight:normal" id="docs-internal"><p><span style="font-weight:700">Bold</span> <span style="font-style:italic">leans</span> <span style="font-weight:400">plain</span></p></b>'
			)
		).toEqual(['paragraph: <strong>Bold</strong> <em>leans</em> plain']);
	});

	test('smart quotes, dashes, special spaces and the real minus stay', () => {
		expect(lines('<p>“It’s −19&nbsp;°C” – so&hellip; 5&#8239;000 &#x2212;2</p>')).toEqual([
			'paragraph: “It’s −19\u00a0°C” – so… 5\u202f000 −2'
		]);
		expect(lines('<p>&#147;old&#148; &#150; &#0;&#xD800;</p>')).toEqual(['paragraph: “old” –']);
	});

	test('superscripts and subscripts become characters', () => {
		expect(
			lines('<p>10<sup>24</sup> kg, s<sup>−1</sup>, H<sub>2</sub>O, 1<sup>st</sup></p>')
		).toEqual(['paragraph: 10²⁴ kg, s⁻¹, H₂O, 1st']);
	});

	test('tracked changes are taken as made, comments stay behind', () => {
		const html =
			'<p>It is <del cite="mailto:a"><span>hot</span></del><ins cite="mailto:a">cold</ins> there<span style="mso-comment-reference:AB_1"></span>.<span class=MsoCommentReference><a class=msocomanchor href="#_msocom_1">[AB1]</a></span></p><div style="mso-element:comment-list"><p>really?</p></div>';
		expect(lines(html)).toEqual(['paragraph: It is cold there.']);
		expect(notes(html).join(' ')).toContain('tracked deletion was taken as made');
		expect(notes(html).join(' ')).toContain('comment was left out');
	});

	test('lists, in HTML and in the clipboard’s own dialect', () => {
		expect(
			lines('<ul><li>air</li><li><p>water</p></li></ul><ol start="3"><li>iron<li>gold</ol>')
		).toEqual([
			'paragraph: –\u00a0air',
			'paragraph: –\u00a0water',
			'paragraph: 3.\u00a0iron',
			'paragraph: 4.\u00a0gold'
		]);
		const mso = `<p class=MsoListParagraph style='mso-list:l0 level1 lfo1'><![if !supportLists]><span style='mso-list:Ignore'>·<span>&nbsp;&nbsp; </span></span><![endif]>rain</p><p class=MsoListParagraph style='mso-list:l1 level1 lfo2'><span style='mso-list:Ignore'>2.<span>&nbsp; </span></span>snow</p>`;
		expect(lines(mso)).toEqual(['paragraph: –\u00a0rain', 'paragraph: 2.\u00a0snow']);
	});

	test('tables become lines with tabs, nested ones one cell', () => {
		const html =
			'<table><tr><th><p>Body</p></th><th>Speed</th></tr><tr><td>Moon</td><td><table><tr><td>2.38</td><td>km/s</td></tr></table></td></tr></table><p>After</p>';
		expect(lines(html)).toEqual([
			'paragraph: Body\tSpeed',
			'paragraph: Moon\t2.38; km/s',
			'paragraph: After'
		]);
		expect(notes(html)).toEqual(['One table came in as lines, their cells apart by tabs.']);
	});

	test('footnotes stand at the end', () => {
		const html = `<p>It is far<a style='mso-footnote-id:ftn1' href="#_ftn1" name="_ftnref1"><span class=MsoFootnoteReference>[1]</span></a>.</p><div style='mso-element:footnote-list'><hr><div style='mso-element:footnote' id=ftn1><p class=MsoFootnoteText><a href="#_ftnref1">[1]</a> From the almanac.</p></div></div>`;
		expect(lines(html)).toEqual(['paragraph: It is far.', 'aside: From the almanac.']);
		expect(notes(html)).toEqual(['One footnote stands at the end as asides.']);
	});

	test('links keep their words, and their addresses beside the copy', () => {
		const copy = copyFromHtml(
			'<p>See <a href="https://example.org/a?b=1&amp;c=2">the table</a>, <a href="javascript:alert(1)">this</a>.</p>'
		);
		expect(copy.blocks.map(words)).toEqual(['See the table, this.']);
		expect(copy.links).toEqual([{ text: 'the table', url: 'https://example.org/a?b=1&c=2' }]);
	});

	test('pictures, equations and hidden text are named', () => {
		const html =
			'<p>A<img src="file:///c/a.png">B<span style="display:none">secret</span></p><math><mi>x</mi></math>';
		expect(lines(html)).toEqual(['paragraph: AB']);
		expect(notes(html)).toEqual([
			'One picture was left out. Pictures come in at the picture desk, with their credit.',
			'Hidden text was left out.',
			'One equation was left out. Equations come from calculators.'
		]);
	});
});

describe('hostile and broken markup', () => {
	test.each([
		['<script>alert(1)</script><p>a</p>', ['paragraph: a']],
		['<p onclick="x()">a<style>p{}</style></p>', ['paragraph: a']],
		['<p>a<scr<script>ipt>b', ['paragraph: aipt>b']],
		['<iframe srcdoc="<p>x</p>"><p>y</p></iframe>z', ['paragraph: z']],
		['<p>1 < 2 and 3 > 2 & so on', ['paragraph: 1 < 2 and 3 > 2 & so on']],
		['<p>a<!-- b', ['paragraph: a']],
		['<p>a</p></div></p><b>c', ['paragraph: a', 'paragraph: <strong>c</strong>']],
		['<svg><script>x</script><text>y</text></svg>z', ['paragraph: z']]
	])('%s', (html, expected) => {
		expect(lines(html)).toEqual(expected);
	});

	test('deep nesting and floods of tags are read in time', () => {
		const start = performance.now();
		expect(lines('<div>'.repeat(50_000) + 'deep' + '</div>'.repeat(50_000))).toEqual([
			'paragraph: deep'
		]);
		expect(lines('<p '.repeat(20_000))).toEqual([]);
		expect(lines('<a b="'.repeat(20_000)).length).toBeLessThanOrEqual(1);
		expect(lines('<!--'.repeat(50_000) + 'x')).toEqual([]);
		expect(performance.now() - start).toBeLessThan(2_000);
	});

	test('whatever comes in, plain data comes out', () => {
		const piece = fc.constantFrom(
			'<p>',
			'</p>',
			'<td>',
			'</table>',
			'<table>',
			'<li>',
			'<ul>',
			'</ul>',
			'<b>',
			'</i>',
			'<br>',
			'&amp;',
			'&#1',
			'<',
			'"',
			'word ',
			'<!--',
			'-->',
			'<del>',
			'</del>',
			'<h1>',
			'</h1>',
			'<sup>',
			'7'
		);
		fc.assert(
			fc.property(fc.array(piece, { maxLength: 60 }), (pieces) => {
				for (const block of copyFromHtml(pieces.join('')).blocks) {
					expect(block.content.length).toBeGreaterThan(0);
					for (const inline of block.content) expect(inline.text.length).toBeGreaterThan(0);
				}
			}),
			{ numRuns: 500 }
		);
	});

	test('no word of plain paragraphs is lost', () => {
		const word = fc.stringMatching(/^[a-zäñ0-9’−]{1,8}$/);
		const paragraphs = fc.array(fc.array(word, { minLength: 1, maxLength: 8 }), {
			minLength: 1,
			maxLength: 12
		});
		fc.assert(
			fc.property(paragraphs, (all) => {
				const html = all
					.map((list) => `<div><p><span>${list.join('</span> <i>')}</i></span></p></div>`)
					.join('\n');
				const read = copyFromHtml(html).blocks.map(({ content }) =>
					content.map(({ text }) => text).join('')
				);
				expect(read).toEqual(all.map((list) => list.join(' ')));
			})
		);
	});
});

test('a piece takes 200 blocks; what is over is named', () => {
	const copy = copyFromHtml('<p>x</p>'.repeat(203));
	expect(copy.blocks).toHaveLength(200);
	expect(copy.notes.at(-1)).toBe(
		'A piece takes 200 blocks: the last 3 paragraphs of this text were left out.'
	);
});

test('plain text: empty lines part paragraphs, or line ends where there are none', () => {
	const kinds = (text: string) => copyFromText(text).blocks.map(words);
	expect(kinds('a\r\nb\r\n\r\nc')).toEqual(['a b', 'c']);
	expect(kinds('a\nb\u0000\tc')).toEqual(['a', 'b\tc']);
});
