/**
 * Copy out of a .docx file. The file is a stranger’s: only its parts with text are unpacked, within limits, and packed
 * anew for the reader, so that it never sees pictures, macros or a part whose size was a lie.
 */
import { copyFromHtml } from '../../import/html-copy.ts';
import type { ImportedCopy, LeftOut } from '../../import/imported-copy.ts';
import { htmlOfPackage } from './aside-reader.ts';
import { packStored } from './pack.ts';
import { readParts, type Parts } from './parts.ts';
import { WordFileRefused } from './refusal.ts';

const DOCUMENT = 'word/document.xml';
const TEXT_PARTS =
	/^(?:\[Content_Types\]\.xml|_rels\/\.rels|word\/(?:document|styles|numbering|footnotes|endnotes)\.xml|word\/_rels\/(?:document|footnotes|endnotes)\.xml\.rels)$/u;
/** Elements within elements; the reader goes down them one call each. */
const DEEPEST_XML = 250;

/** Throws a `WordFileRefused`, which says what is wrong and how to mend it. */
export async function readWordFile(file: Buffer): Promise<ImportedCopy> {
	refuseDisguise(file);
	const parts = readParts(file, (name) => TEXT_PARTS.test(name));
	refuseOthers(parts);
	for (const xml of parts.texts.values()) refuseForeignXml(xml);
	const document = parts.texts.get(DOCUMENT)?.toString('utf8') ?? '';
	// Each picture is counted below, together with those that the reader can’t make out.
	const html = (await htmlOfPackage(packStored(parts.texts))).replace(/<img\b[^>]*>/gu, '');
	return copyFromHtml(html, { whole: true, missing: missingFrom(document, parts.names) });
}

/** By its first bytes, whatever it is called. */
function refuseDisguise(file: Buffer): void {
	if (file.length === 0) throw new WordFileRefused('empty');
	if (file.subarray(0, 8).toString('hex') === 'd0cf11e0a1b11ae1')
		throw new WordFileRefused('old-word');
	if (file.subarray(0, 4).toString('hex') !== '504b0304') throw new WordFileRefused('not-zip');
}

function refuseOthers({ texts, names }: Parts): void {
	if (texts.has(DOCUMENT)) return;
	if (names.includes('content.xml') && names.includes('mimetype'))
		throw new WordFileRefused('open-document');
	throw new WordFileRefused('other-office');
}

/** ECMA-376 part 2 forbids document type declarations in a package: what an entity trick needs. */
function refuseForeignXml(xml: Buffer): void {
	const utf16 = xml[0] === 0xff || xml[0] === 0xfe || xml.includes(0);
	if (utf16 || /<!(?:DOCTYPE|ENTITY)/iu.test(xml.toString('latin1')))
		throw new WordFileRefused('foreign-xml');
	let depth = 0;
	for (const tag of xml.toString('latin1').matchAll(/<(\/?)[A-Za-z][^<>]*?(\/?)>/gu)) {
		depth += tag[1] ? -1 : tag[2] ? 0 : 1;
		if (depth > DEEPEST_XML) throw new WordFileRefused('foreign-xml');
	}
}

/** What the reader passes over without a word. */
function missingFrom(document: string, names: readonly string[]): LeftOut[] {
	const times = (kind: LeftOut, pattern: RegExp): LeftOut[] =>
		(document.match(pattern) ?? []).map(() => kind);
	return [
		...times('picture', /<(?:w:drawing|w:pict)[\s/>]/gu),
		...times('equation', /<m:oMath[\s>]/gu),
		...times('comment', /<w:commentReference[\s/>]/gu),
		...times('deletion', /<w:del[\s>]/gu),
		...times('hidden', /<w:vanish\s*\/>/gu).slice(0, 1),
		...names.filter((name) => name.startsWith('word/embeddings/')).map(() => 'embedded' as const),
		...(names.some((name) => name.endsWith('vbaProject.bin')) ? (['macro'] as const) : [])
	];
}
