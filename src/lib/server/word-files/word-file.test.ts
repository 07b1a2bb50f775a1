/** Real .docx packages, made here part by part, honest and hostile ones. */
import { deflateRawSync } from 'node:zlib';
import { describe, expect, test } from 'vitest';
import { packStored } from './pack.ts';
import { WordFileRefused, type Refusal } from './refusal.ts';
import { readWordFile } from './word-file.ts';

const W = 'http://schemas.openxmlformats.org/wordprocessingml/2006/main';
const R = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const PACKAGE = 'http://schemas.openxmlformats.org/package/2006';
const OFFICE = 'application/vnd.openxmlformats-officedocument.wordprocessingml';

const documentXml = (
	body: string,
	head = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>'
) =>
	`${head}<w:document xmlns:w="${W}" xmlns:r="${R}" xmlns:m="http://schemas.openxmlformats.org/officeDocument/2006/math"><w:body>${body}</w:body></w:document>`;
const run = (text: string, look = '') =>
	`<w:r><w:rPr>${look}</w:rPr><w:t xml:space="preserve">${text}</w:t></w:r>`;
const paragraph = (content: string, style = '') =>
	`<w:p><w:pPr>${style ? `<w:pStyle w:val="${style}"/>` : ''}</w:pPr>${content}</w:p>`;

const styles = `<w:styles xmlns:w="${W}">${[
	['Title', 'Title'],
	['Heading1', 'heading 1'],
	['Quote', 'Quote']
]
	.map(
		([id, name]) =>
			`<w:style w:type="paragraph" w:styleId="${id}"><w:name w:val="${name}"/></w:style>`
	)
	.join('')}</w:styles>`;

function packageOf(body: string, more: Record<string, string | Buffer> = {}): Map<string, Buffer> {
	const parts: Record<string, string | Buffer> = {
		'[Content_Types].xml': `<Types xmlns="${PACKAGE}/content-types"><Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/><Default Extension="xml" ContentType="application/xml"/><Override PartName="/word/document.xml" ContentType="${OFFICE}.document.main+xml"/></Types>`,
		'_rels/.rels': `<Relationships xmlns="${PACKAGE}/relationships"><Relationship Id="r1" Type="${R}/officeDocument" Target="word/document.xml"/></Relationships>`,
		'word/_rels/document.xml.rels': `<Relationships xmlns="${PACKAGE}/relationships"><Relationship Id="s" Type="${R}/styles" Target="styles.xml"/><Relationship Id="f" Type="${R}/footnotes" Target="footnotes.xml"/><Relationship Id="l" Type="${R}/hyperlink" Target="https://example.org/table" TargetMode="External"/><Relationship Id="p" Type="${R}/image" Target="media/a.png"/><Relationship Id="x" Type="${R}/image" Target="file:///etc/hostname" TargetMode="External"/></Relationships>`,
		'word/styles.xml': styles,
		'word/document.xml': documentXml(body),
		...more
	};
	return new Map(Object.entries(parts).map(([name, text]) => [name, Buffer.from(text)]));
}

/** A package packed as word processors pack: each part deflated; `lie` changes the declared sizes. */
function packDeflated(
	parts: ReadonlyMap<string, Buffer>,
	lie?: (name: string) => number | undefined
) {
	const stored = packStored(
		new Map([...parts].map(([name, bytes]) => [name, deflateRawSync(bytes)]))
	);
	for (let at = 0; at < stored.length - 46; at++) {
		const signature = stored.readUInt32LE(at);
		const local = signature === 0x04034b50;
		if (!local && signature !== 0x02014b50) continue;
		const shift = local ? 0 : 2;
		const nameLength = stored.readUInt16LE(at + shift + 26);
		const nameAt = at + (local ? 30 : 46);
		const name = stored.toString('utf8', nameAt, nameAt + nameLength);
		const bytes = parts.get(name);
		if (!bytes) continue;
		stored.writeUInt16LE(8, at + shift + 8);
		stored.writeUInt32LE(lie?.(name) ?? bytes.length, at + shift + 22);
	}
	return stored;
}

const read = (body: string, more?: Record<string, string | Buffer>) =>
	readWordFile(packDeflated(packageOf(body, more)));
const lines = (copy: Awaited<ReturnType<typeof read>>) =>
	copy.blocks.map(
		({ kind, content }) =>
			`${kind}: ${content.map(({ text, marks }) => (marks ? `[${marks.join('+')} ${text}]` : text)).join('')}`
	);

test('title, heading, emphasis, lists, tables, footnotes, links and tracked changes', async () => {
	const body = [
		paragraph(run('Rain and hail'), 'Title'),
		paragraph(run('What falls'), 'Heading1'),
		paragraph(
			run('A drop falls ') +
				run('fast', '<w:b/>') +
				run(', “so” −19 °C, 10') +
				run('24', '<w:vertAlign w:val="superscript"/>') +
				'<w:r><w:footnoteReference w:id="2"/></w:r>' +
				`<w:del w:id="1" w:author="a"><w:r><w:delText>gone</w:delText></w:r></w:del><w:ins w:id="2" w:author="a">${run(' kept')}</w:ins>`
		),
		`<w:tbl><w:tr><w:tc>${paragraph(run('Moon'))}</w:tc><w:tc>${paragraph(run('2.38'))}</w:tc></w:tr></w:tbl>`,
		paragraph(`<w:hyperlink r:id="l">${run('the table')}</w:hyperlink>`),
		paragraph(
			'<w:r><w:drawing/></w:r><w:r><w:commentReference w:id="1"/></w:r><m:oMath><m:r><m:t>x</m:t></m:r></m:oMath>'
		)
	].join('');
	const copy = await read(body, {
		'word/footnotes.xml': `<w:footnotes xmlns:w="${W}"><w:footnote w:id="2">${paragraph(run('From the almanac.'))}</w:footnote></w:footnotes>`
	});
	expect(copy.title).toBe('Rain and hail');
	expect(lines(copy)).toEqual([
		'heading: What falls',
		'paragraph: A drop falls [strong fast], “so” −19 °C, 10²⁴ kept',
		'paragraph: Moon\t2.38',
		'paragraph: the table',
		'aside: From the almanac.'
	]);
	expect(copy.links).toEqual([{ text: 'the table', url: 'https://example.org/table' }]);
	expect(copy.notes).toEqual([
		'One picture was left out. Pictures come in at the picture desk, with their credit.',
		'One equation was left out. Equations come from calculators.',
		'One comment was left out.',
		'One tracked deletion was taken as made, and insertions as kept.',
		'One table came in as lines, their cells apart by tabs.',
		'One footnote stands at the end as asides.'
	]);
});

test('macros and pictures are never opened', async () => {
	const drawn = paragraph(
		`${run('Text')}<w:r><w:drawing><wp:inline xmlns:wp="http://schemas.openxmlformats.org/drawingml/2006/wordprocessingDrawing"><a:graphic xmlns:a="http://schemas.openxmlformats.org/drawingml/2006/main"><a:graphicData><pic:pic xmlns:pic="http://schemas.openxmlformats.org/drawingml/2006/picture"><pic:blipFill><a:blip r:embed="p" r:link="x"/></pic:blipFill></pic:pic></a:graphicData></a:graphic></wp:inline></w:drawing></w:r>`
	);
	const copy = await read(drawn, {
		'word/vbaProject.bin': Buffer.from('Sub AutoOpen()'),
		'word/media/a.png': Buffer.alloc(64)
	});
	expect(lines(copy)).toEqual(['paragraph: Text']);
	expect(copy.notes).toEqual([
		'One picture was left out. Pictures come in at the picture desk, with their credit.',
		'Macros were left out; nothing of them was run.'
	]);
	expect(JSON.stringify(copy)).not.toContain('hostname');
});

describe('refused, with a sentence', () => {
	const plain = packageOf(paragraph(run('Text')));
	const whole = packDeflated(plain);
	const withDocument = (xml: string | Buffer) =>
		packDeflated(new Map([...plain, ['word/document.xml', Buffer.from(xml)]]));
	const xxe = '<?xml version="1.0"?><!DOCTYPE w [<!ENTITY f SYSTEM "file:///etc/passwd">]>';
	const laughs = `<?xml version="1.0"?><!DOCTYPE w [<!ENTITY a "ha">${Array.from({ length: 9 }, (_, index) => `<!ENTITY ${'bcdefghij'[index]} "${`&${'abcdefghi'[index]};`.repeat(10)}">`).join('')}]>`;

	const cases: [string, Buffer, Refusal][] = [
		['an empty file', Buffer.alloc(0), 'empty'],
		['a page with the wrong name', Buffer.from('<html><body>hello</body></html>'), 'not-zip'],
		['a PDF with the wrong name', Buffer.from('%PDF-1.7 and so on'), 'not-zip'],
		['an old or locked file', Buffer.from('d0cf11e0a1b11ae10000000000', 'hex'), 'old-word'],
		['half a file', whole.subarray(0, whole.length / 2), 'broken'],
		['all but the end', whole.subarray(0, whole.length - 30), 'broken'],
		['a directory that points nowhere', brokenOffsets(whole), 'broken'],
		['damaged text', damaged(whole), 'broken'],
		['XML that ends too early', withDocument(documentXml('<w:p>').slice(0, -40)), 'broken'],
		[
			'an entity from outside',
			withDocument(documentXml(paragraph(run('&f;')), xxe)),
			'foreign-xml'
		],
		['a billion laughs', withDocument(documentXml(paragraph(run('&j;')), laughs)), 'foreign-xml'],
		[
			'the same in UTF-16',
			withDocument(Buffer.from(`\ufeff${documentXml('', xxe)}`, 'utf16le')),
			'foreign-xml'
		],
		[
			'elements in elements without end',
			withDocument(documentXml('<w:p>'.repeat(100_000))),
			'foreign-xml'
		],
		['a bomb that says its size', withDocument(documentXml(' '.repeat(300 * 1024 * 1024))), 'bomb'],
		[
			'a bomb that lies',
			packDeflated(
				new Map([
					...plain,
					['word/document.xml', Buffer.from(documentXml(' '.repeat(20 * 1024 * 1024)))]
				]),
				(name) => (name === 'word/document.xml' ? 500 : undefined)
			),
			'bomb'
		],
		[
			'a text of 5 MB',
			withDocument(documentXml(paragraph(run('long '.repeat(1_000_000))))),
			'too-long'
		],
		['a sheet', packDeflated(new Map([['xl/workbook.xml', Buffer.from('<a/>')]])), 'other-office'],
		[
			'an .odt file',
			packDeflated(
				new Map([
					['mimetype', Buffer.from('application/vnd.oasis.opendocument.text')],
					['content.xml', Buffer.from('<a/>')]
				])
			),
			'open-document'
		]
	];

	test.each(cases)('%s', async (_, file, why) => {
		const start = performance.now();
		const before = process.memoryUsage().rss;
		await expect(readWordFile(file)).rejects.toMatchObject({ why });
		await expect(readWordFile(file)).rejects.toBeInstanceOf(WordFileRefused);
		expect(performance.now() - start).toBeLessThan(2_000);
		expect(process.memoryUsage().rss - before).toBeLessThan(150 * 1024 * 1024);
	});

	function brokenOffsets(file: Buffer): Buffer {
		const copy = Buffer.from(file);
		copy.writeUInt32LE(0x7fffffff, copy.length - 6);
		return copy;
	}

	function damaged(file: Buffer): Buffer {
		const copy = Buffer.from(file);
		const at = copy.indexOf('word/document.xml') + 17;
		copy.fill(0xff, at + 4, at + 24);
		return copy;
	}
});

test('a long honest text is read in time', async () => {
	const long = Array.from({ length: 150 }, () => paragraph(run('word '.repeat(400)))).join('');
	const start = performance.now();
	const copy = await read(long);
	expect(copy.blocks).toHaveLength(150);
	expect(performance.now() - start).toBeLessThan(20_000);
});
