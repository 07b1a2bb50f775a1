/**
 * Shows a document as a reader's system would: dark, in forced colours, on paper. A page can't ask the browser for
 * these, so the media queries in the document's own styles are pointed at what this strip is for; no rule is copied.
 */
import type { Look } from './strips.ts';

const ALWAYS = '(min-width: 0px)';
const NEVER = '(max-width: 0px)';

/** The query as it has to read for the look; the same text when it says nothing of it. */
export function queryFor(query: string, look: Look): string {
	const forced = look === 'forced';
	const turned = query
		.replace(/\(\s*forced-colors\s*:\s*active\s*\)/g, forced ? ALWAYS : NEVER)
		.replace(/\(\s*forced-colors\s*:\s*none\s*\)/g, forced ? NEVER : ALWAYS);
	if (look !== 'print') return turned;
	return turned.replace(/\b(?:print|screen)\b/g, (type) => (type === 'print' ? 'all' : 'speech'));
}

export function applyLook(document: Document, look: Look): void {
	document.documentElement.dataset.scheme = look === 'dark' ? 'dark' : 'light';
	document.documentElement.dataset.look = look;
	for (const sheet of document.styleSheets) turnRules(sheet.cssRules, look);
}

function turnRules(rules: CSSRuleList, look: Look): void {
	for (const rule of rules) {
		if (rule instanceof CSSMediaRule) {
			const query = queryFor(rule.media.mediaText, look);
			if (query !== rule.media.mediaText) rule.media.mediaText = query;
		}
		if (rule instanceof CSSGroupingRule) turnRules(rule.cssRules, look);
	}
}
