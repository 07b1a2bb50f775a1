/**
 * The house's term list: terms of art that want an explanation where they first stand, and spellings the house
 * doesn't use. Data by language; a house with a list of its own passes it in.
 */
import type { Language } from '../widget/language.ts';
import { trapsFor, type Trap } from './traps/trap.ts';

export interface TermList {
	/** Each term with all its forms, as a pattern of words. */
	terms: readonly { starts: string; forms: string }[];
	/** What is written otherwise in this house. */
	forms: readonly { starts: string; avoid: string; prefer: string }[];
}

/** A term by its forms; the words it may start with follow from them. */
const term = (...forms: string[]) => ({
	starts: [...new Set(forms.map((form) => form.split(/[ -]/, 1)[0] ?? ''))].join(' '),
	forms: forms.join('|')
});

export const HOUSE_TERMS: Record<Language, TermList> = {
	en: {
		terms: [
			term('redshift', 'redshifts'),
			term('megaparsec', 'megaparsecs', 'parsec', 'parsecs', 'kiloparsec', 'kiloparsecs'),
			term('brightness temperature', 'brightness temperatures'),
			term('spin temperature', 'spin temperatures'),
			term('reionisation', 'reionization'),
			term('recombination'),
			term('comoving'),
			term('lookback time', 'look-back time'),
			term('scale factor'),
			term('blackbody', 'blackbodies'),
			term('hyperfine'),
			term('angular diameter', 'angular size'),
			term('parallax'),
			term('eccentricity'),
			term('perihelion', 'aphelion'),
			term('semi-major axis'),
			term('half-life', 'half-lives'),
			term('isotope', 'isotopes'),
			term('baryon', 'baryons', 'baryonic'),
			term('Lorentz factor'),
			term('proper time'),
			term('time dilation'),
			term('luminosity'),
			term('adiabatic', 'adiabatically'),
			term('Roche limit'),
			term('Jeans mass', 'Jeans length'),
			term('chirp mass'),
			term('metallicity'),
			term('Bremsstrahlung'),
			term('standard deviation'),
			term('optical depth'),
			term('delta-v'),
			term('escape velocity'),
			term('Hubble constant')
		],
		forms: [
			{ starts: 'red', avoid: 'red[-\\s]shifts?', prefer: 'redshift' },
			{ starts: 'black', avoid: 'black[-\\s]body', prefer: 'blackbody' },
			{ starts: 'micro', avoid: 'micro-?wave', prefer: 'microwave' },
			{ starts: 'gravity', avoid: 'gravity waves?', prefer: 'gravitational waves' }
		]
	},
	de: {
		terms: [
			term('Rotverschiebung', 'Rotverschiebungen'),
			term('Megaparsec', 'Parsec', 'Kiloparsec'),
			term('Strahlungstemperatur', 'Helligkeitstemperatur'),
			term('Spintemperatur'),
			term('Reionisation', 'Reionisierung'),
			term('Rekombination'),
			term('mitbewegt', 'mitbewegte', 'mitbewegten'),
			term('Skalenfaktor'),
			term('Schwarzkörper', 'Schwarzkörpers'),
			term('Hyperfeinstruktur'),
			term('Parallaxe'),
			term('Exzentrizität'),
			term('Perihel', 'Aphel'),
			term('Halbwertszeit', 'Halbwertszeiten'),
			term('Isotop', 'Isotope'),
			term('Lorentzfaktor', 'Lorentz-Faktor'),
			term('Zeitdilatation'),
			term('Leuchtkraft'),
			term('adiabatisch'),
			term('Standardabweichung'),
			term('Hubble-Konstante')
		],
		forms: [
			{ starts: 'rot', avoid: 'Rot-Verschiebung', prefer: 'Rotverschiebung' },
			{ starts: 'gravitations', avoid: 'Gravitations-Welle', prefer: 'Gravitationswelle' }
		]
	},
	es: {
		terms: [
			term('corrimiento al rojo', 'desplazamiento al rojo'),
			term('megapársec', 'megaparsec', 'pársec', 'parsec'),
			term('temperatura de brillo'),
			term('temperatura de espín'),
			term('reionización'),
			term('recombinación'),
			term('factor de escala'),
			term('cuerpo negro'),
			term('hiperfina', 'hiperfino'),
			term('paralaje'),
			term('excentricidad'),
			term('perihelio', 'afelio'),
			term('periodo de semidesintegración', 'semivida'),
			term('isótopo', 'isótopos'),
			term('factor de Lorentz'),
			term('dilatación del tiempo'),
			term('luminosidad'),
			term('adiabático', 'adiabática'),
			term('desviación típica', 'desviación estándar'),
			term('constante de Hubble')
		],
		forms: [{ starts: 'agujeros', avoid: 'agujeros? negro', prefer: 'agujeros negros' }]
	}
};

const trap = trapsFor('one');

/** The list as traps: `undefined-term` wherever a term stands, `house-form` wherever a spelling isn't the house's. */
export function termTraps(list: TermList): Trap[] {
	const small = (starts: string) => starts.toLowerCase();
	return [
		...list.terms.map(({ starts, forms }) =>
			trap(
				'undefined-term',
				small(starts),
				forms,
				'A reader may not know this term, and it isn’t explained where it first stands.',
				{ mend: 'Explain it in the same sentence: “redshift, the stretch of light on its way”.' }
			)
		),
		...list.forms.map(({ starts, avoid, prefer }) =>
			trap('house-form', small(starts), avoid, `The house writes “${prefer}”.`, {
				replacement: () => prefer
			})
		)
	];
}

/** What names a thing just before the term: “astronomers call it redshift”. */
const NAMED =
	/(?:called|known as|named|termed|calls?(?: it| (?:this|that)(?: \p{L}+)?)?|nennt man(?: das| es)?|nennen(?: das| es)?|heißt|genannt|sogenannte[rnms]?|se llama|llaman?|llamad[oa]s?|conocid[oa]s? como)\s*(?:the|an?|die|der|das|el|la)?\s*[“„«"'‘(]?$|\($/iu;

/** What explains it just after: a bracket, a dash, a colon, an apposition, or “is the …”. */
const EXPLAINED =
	/^(?:[^.!?,;]{0,25}?(?:\s?\(|\s[–—]\s|:\s)|[”’»"']?\s*,\s*(?:that is|which (?:is|says|tells|means)|the|an?|or|meaning|how|what|das heißt|also|der|die|das|eine?|oder|wie|es decir|o sea|el|la|una?|o|que (?:es|dice))\s|[”’»"']?\s+(?:is|are|means|measures|says|tells|counts|ist|sind|bedeutet|misst|sagt|heißt|es|son|significa|mide|dice)\s+(?:us\s+)?(?:the|an?|how|what|that|by|der|die|das|eine?|wie|was|um|dass|el|la|una?|cuánto|cómo|qué|que)\s)/iu;

/** Whether a term that stands from…to is explained by the words beside it. */
export function isExplained(text: string, from: number, to: number): boolean {
	return (
		NAMED.test(text.slice(Math.max(0, from - 40), from)) || EXPLAINED.test(text.slice(to, to + 90))
	);
}
