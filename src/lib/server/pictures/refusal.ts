/** Why an upload isn’t taken: one sentence for what is wrong, one for how to mend it. */
import { SteelyardError } from '../../errors.ts';

const SAVE_AGAIN = 'Open it in a picture program and save it as PNG, JPEG or WebP.';
const PLAIN_SVG = 'Save it as plain SVG without this, or as PNG, and send it again.';

const REFUSALS = {
	empty: ['This file is empty.', 'Choose it again; it may not have been saved yet.'],
	text: ['This is text, not a picture.', 'Choose the picture itself.'],
	html: [
		'This is a web page, not a picture.',
		'Open the page, save the picture from it, and send that.'
	],
	xml: ['This is XML, but no SVG picture.', 'Choose an SVG file, or save the drawing as PNG.'],
	pdf: ['This is a PDF, not a picture.', 'Export the page as PNG and send that.'],
	packed: ['This is a packed file, not a picture.', 'Unpack it and send the picture inside.'],
	gif: ['GIF isn’t taken.', 'Save one still of it as PNG.'],
	tiff: ['TIFF isn’t taken.', 'Save it as PNG, or as JPEG when it is a photograph.'],
	bmp: ['BMP isn’t taken.', 'Save it as PNG.'],
	heic: ['HEIC isn’t taken.', 'Export it as JPEG; most telephones can, when sharing.'],
	film: ['This is a film, not a picture.', 'Save one still of it as PNG or JPEG.'],
	unknown: ['This isn’t a picture that can be read.', SAVE_AGAIN],
	damaged: [
		'The picture is damaged: it ends too early, or part of it can’t be read.',
		'Send it again from where it came from, or open it and save it anew.'
	],
	animated: ['This picture moves or has several pages.', 'Save one still of it as PNG.'],
	hidden: ['Something else is hidden in this picture file.', SAVE_AGAIN],
	'svg-heavy': [
		'This SVG is larger than 2 MB or has more than 20,000 parts.',
		'Simplify the drawing, or save it as PNG.'
	],
	'svg-broken': [
		'This SVG isn’t well-formed XML in UTF-8.',
		'Open it in a drawing program and save it as plain SVG, or as PNG.'
	],
	'svg-entities': ['This SVG defines entities of its own.', PLAIN_SVG],
	'svg-script': ['This SVG carries a script.', PLAIN_SVG],
	'svg-outside': [
		'This SVG reaches for something outside itself, or holds another file.',
		'Draw it into the SVG, or save the whole as PNG, and send it again.'
	],
	'svg-tangled': [
		'This SVG repeats its parts inside one another without end, or too often.',
		'Save it as PNG and send that.'
	],
	'svg-sizeless': [
		'This SVG doesn’t say how large it is.',
		'Give it a viewBox, or a width and a height, and save it again.'
	]
} as const satisfies Record<string, readonly [says: string, mend: string]>;

type Fixed = keyof typeof REFUSALS;
export type RefusalReason =
	Fixed | 'renamed' | 'declared' | 'too-many-pixels' | 'too-long' | 'svg-part';

/** The error to throw. */
export function refuse(why: Fixed): SteelyardError {
	const [says, mend] = REFUSALS[why];
	return refuseIn(why, says, mend);
}

/** For sentences that name what was found. */
export function refuseIn(why: RefusalReason, says: string, mend: string): SteelyardError {
	return new SteelyardError('picture-refused', { why, says, mend });
}
