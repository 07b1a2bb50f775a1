/**
 * What readers who don't see a picture or a chart get instead, and headings they move by. W3C, Web Content Accessibility
 * Guidelines 2.2, 2023 (1.1.1, 1.3.1, 2.4.6); W3C WAI tutorial, Complex Images: a description says scale, values and trend.
 */
import type { CopyPart } from './copy.ts';
import type { Language } from '../widget/language.ts';
import type { Finding } from './note.ts';

const PICTURE_OF: Record<Language, RegExp> = {
	en: /^(?:an? |the )?(?:picture|image|photo(?:graph)?|graphic|drawing|illustration|chart|graph) (?:of|showing|that shows)/iu,
	de: /^(?:ein |eine |das |die )?(?:Bild|Foto|Grafik|Zeichnung|Abbildung|Diagramm)(?: von| der| des| eine[rs]?|, (?:das|die))/iu,
	es: /^(?:una? |el |la )?(?:imagen|foto(?:grafía)?|gráfico|dibujo|ilustración) (?:del?|que muestra)/iu
};

const TREND: Record<Language, RegExp> = {
	en: /\b(?:ris|fall|fell|rose|grow|grew|shrink|shrank|climb|drop|increas|decreas|stead|level|peak|steep|flat|doubl|halv|longer|shorter|higher|lower|larger|smaller|faster|slower|up|down|trough|constant|bend|dip|straight|curve)/iu,
	de: /(?:steig|stieg|fäll|fiel|fallen|wächs|wachs|wuchs|sink|sank|nimmt|nehmen|zunehm|abnehm|gleich|flach|steil|verdoppel|halbier|höher|niedriger|länger|kürzer|größer|kleiner|gipfel|senke|gerade)/iu,
	es: /(?:sube|suben|subi|baja|cae|cay|crec|disminu|aument|descien|asciend|constante|plan[oa]|empinad|duplic|mitad|más|menos|mayor|menor|máximo|mínimo|recta)/iu
};

export function besideFindings(part: CopyPart, language: Language): Finding[] {
	if (part.field === 'alt') return altFindings(part, language);
	if (part.field === 'description' && part.kind === 'chart') return chartFindings(part, language);
	return [];
}

function altFindings({ text, beside = '' }: CopyPart, language: Language): Finding[] {
	const found: Finding[] = [];
	const opening = PICTURE_OF[language].exec(text);
	if (opening) {
		found.push({
			code: 'alt-picture-of',
			from: 0,
			to: opening[0].length,
			says: 'A screen reader says “picture” by itself.',
			mend: 'Start with what is in it.'
		});
	}
	const plain = (words: string) =>
		words
			.toLowerCase()
			.replace(/[^\p{L}\p{N}]+/gu, ' ')
			.trim();
	if (plain(text) !== '' && plain(text) === plain(beside)) {
		found.push({
			code: 'alt-repeats',
			from: 0,
			to: text.length,
			says: 'These words repeat the caption, and are heard twice.',
			mend: 'Say what the picture shows and the caption doesn’t.'
		});
	}
	return found;
}

/** Numbers aren't asked for: they can't be tied in a description yet, and the table under the chart gives them all. */
function chartFindings({ text }: CopyPart, language: Language): Finding[] {
	if (TREND[language].test(text)) return [];
	return [
		{
			code: 'description-thin',
			from: 0,
			to: text.length,
			says: 'The description leaves out whether it rises, falls or stays.',
			mend: 'Say where the line starts, where it ends, and what it does between.'
		}
	];
}

/** Headings in their order; `parts` are those of the whole piece. */
export function headingFindings(
	parts: readonly CopyPart[]
): { part: CopyPart; finding: Finding }[] {
	let levelBefore = 1;
	return parts.flatMap((part, index) => {
		if (part.kind !== 'heading') return [];
		const { text, level = 2 } = part;
		const whole = { from: 0, to: text.length };
		const found: Finding[] = [];
		const next = parts.slice(index + 1).find(({ block }) => block !== part.block);
		if (text.trim() === '') {
			found.push({
				code: 'heading-empty',
				...whole,
				says: 'This heading has no words, and is still read out as one.',
				mend: 'Write it, or take it out.'
			});
		} else if (!next || (next.kind === 'heading' && (next.level ?? 2) <= level)) {
			found.push({
				code: 'heading-empty',
				...whole,
				says: 'Nothing stands under this heading.',
				mend: 'Write something under it, or take it out.'
			});
		}
		if (level > levelBefore + 1) {
			found.push({
				code: 'heading-order',
				...whole,
				says: `A heading of level ${level} follows one of level ${levelBefore}.`,
				mend: `Make it level ${levelBefore + 1}.`
			});
		}
		levelBefore = level;
		if (/[^.…]\.\s*$/u.test(text)) {
			found.push({
				code: 'heading-stop',
				from: text.trimEnd().length - 1,
				to: text.trimEnd().length,
				says: 'A heading takes no full stop.',
				replacement: ''
			});
		}
		return found.map((finding) => ({ part, finding }));
	});
}
