/** Why a file can’t be taken as a word file, in sentences: what is wrong and how to mend it. */
export const REFUSALS = {
	empty: {
		says: 'This file is empty.',
		mend: 'Save it again in the word processor, then choose it once more.'
	},
	'not-zip': {
		says: 'This isn’t a .docx file, whatever its name says.',
		mend: 'Open it in a word processor and save it as .docx.'
	},
	'old-word': {
		says: 'This is a .doc file of the old kind, or one that is locked with a password.',
		mend: 'Open it in a word processor and save it as .docx, without a password.'
	},
	'other-office': {
		says: 'This file holds no word-processor text: it is a sheet, slides or another kind.',
		mend: 'Save the text as .docx, or paste it into the manuscript.'
	},
	'open-document': {
		says: 'This is an .odt file.',
		mend: 'Save it as .docx in the same program.'
	},
	broken: {
		says: 'This file is cut off or damaged.',
		mend: 'Copy it again from where it came from, or paste the text into the manuscript.'
	},
	bomb: {
		says: 'Unpacked, this file is far larger than a text can be.',
		mend: 'Save only the text, without pictures and old versions, as a new .docx.'
	},
	'too-long': {
		says: 'This text is longer than the house takes at once.',
		mend: 'Bring in one chapter at a time, or paste the part you need.'
	},
	'foreign-xml': {
		says: 'This file holds instructions that a .docx may not hold.',
		mend: 'Open it in a word processor and save it as a new .docx.'
	}
} as const;
export type Refusal = keyof typeof REFUSALS;

export class WordFileRefused extends Error {
	constructor(readonly why: Refusal) {
		super(REFUSALS[why].says);
		this.name = 'WordFileRefused';
	}
}
