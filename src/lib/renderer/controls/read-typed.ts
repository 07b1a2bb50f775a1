/** Reads a number as people type it in a language: “1 420,4”, “1,420.4”, “−19”, “1.5e-18”. Null when it is none. */
import type { Language } from '../../widget/language.ts';

const GROUPS = /[\s\u00a0\u202f']/g;

export function readTyped(text: string, language: Language): number | null {
	const plain = text.trim().replace(/[−–]/g, '-').replace(GROUPS, '');
	const pointed =
		language === 'en' ? plain.replace(/,(?=\d{3}(?:\D|$))/g, '') : localDecimal(plain);
	if (!/^[-+]?(\d+\.?\d*|\.\d+)(e[-+]?\d+)?$/i.test(pointed)) return null;
	const value = Number(pointed);
	return Number.isFinite(value) ? value : null;
}

/** A comma is the decimal mark; points then only group. Without a comma a single point is taken as the mark. */
function localDecimal(plain: string): string {
	if (plain.includes(',')) return plain.replace(/\.(?=\d{3})/g, '').replace(',', '.');
	return (plain.match(/\./g)?.length ?? 0) > 1 ? plain.replaceAll('.', '') : plain;
}
