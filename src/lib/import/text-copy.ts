/** Copy out of plain text: an empty line, or any line end in a passage without empty lines, starts a paragraph. */
import { CopyGatherer, type ImportedCopy } from './imported-copy.ts';

export function copyFromText(text: string): ImportedCopy {
	const gathered = new CopyGatherer();
	const clean = text.replace(/\r\n?/gu, '\n').replace(/[^\P{Cc}\t\n]/gu, '');
	const parted = /\n[ \t]*\n/u.test(clean) ? /\n[ \t]*\n/u : /\n/u;
	for (const words of clean.split(parted))
		gathered.add('paragraph', [{ kind: 'text', text: words }]);
	return gathered.finish({ whole: false });
}
