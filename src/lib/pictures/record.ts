/** What the picture desk keeps of a picture, and what is missing before it may be used. Pure. */
import { z } from 'zod';
import { LICENCE_IDS, type LicenceId } from './licences.ts';

/** What a science picture is; several may hold. */
export const PICTURE_LABELS = {
	photograph: 'Photograph',
	diagram: 'Diagram',
	'artists-impression': 'Artist’s impression',
	simulation: 'Simulation',
	'false-colour': 'False colour',
	'not-to-scale': 'Not to scale'
} as const;
export type PictureLabel = keyof typeof PICTURE_LABELS;
export const LABEL_IDS = Object.keys(PICTURE_LABELS) as [PictureLabel, ...PictureLabel[]];

const words = (most: number, what: string) =>
	z.string().trim().max(most, `${what} takes at most ${most} characters. Shorten it.`);

const isDay = (text: string) =>
	/^\d{4}-\d{2}-\d{2}$/.test(text) &&
	!Number.isNaN(Date.parse(text)) &&
	new Date(text).toISOString().startsWith(text);

/** Unfilled fields are empty strings, so that a record can be kept half done. */
export const PictureRecord = z.strictObject({
	/** Who made the picture. */
	creator: words(160, 'The creator'),
	/** As it is printed beside the picture. */
	credit: words(200, 'The credit line'),
	licence: z.enum(['', ...LICENCE_IDS]),
	/** For a permission in writing: who gave it, when, and for what. */
	licenceNote: words(400, 'The note on the permission'),
	/** Where it was taken from: an address, an archive with its number, a letter. */
	source: words(400, 'The source'),
	/** Last day it may be shown, as 2027-01-31; empty when the rights don’t end. */
	rightsEnd: z
		.string()
		.trim()
		.refine((text) => text === '' || isDay(text), {
			message: 'Write the day as year, month and day, such as 2027-01-31, or leave it empty.'
		}),
	/** What it shows, for someone who can’t see it. */
	alt: words(500, 'The description'),
	/** Why nobody misses it who can’t see it; empty when `alt` is given. */
	decorative: words(200, 'The reason'),
	labels: z.array(z.enum(LABEL_IDS)).max(LABEL_IDS.length),
	/** People who can be recognised: none, or all of them agreed. */
	people: z.enum(['', 'none-shown', 'consent-given']),
	/** Who agreed, and where the consent is kept. */
	consentNote: words(400, 'The note on the consent')
});
export type PictureRecord = z.infer<typeof PictureRecord>;

export const emptyRecord = (): PictureRecord => ({
	creator: '',
	credit: '',
	licence: '',
	licenceNote: '',
	source: '',
	rightsEnd: '',
	alt: '',
	decorative: '',
	labels: [],
	people: '',
	consentNote: ''
});

export interface PictureFinding {
	field: keyof PictureRecord;
	/** What is missing, and how to mend it. */
	says: string;
}

export interface Readiness {
	ready: boolean;
	findings: PictureFinding[];
}

type Rule = (record: PictureRecord, today: string) => PictureFinding | false;

const RULES: Rule[] = [
	({ creator }) =>
		creator === '' && {
			field: 'creator',
			says: 'Who made it isn’t said. Name them, or write “unknown” when the source doesn’t.'
		},
	({ credit }) =>
		credit === '' && {
			field: 'credit',
			says: 'There is no credit line. Write it as it is to stand beside the picture.'
		},
	({ licence }) =>
		licence === '' && {
			field: 'licence',
			says: 'There is no licence. Choose the one its source names; without one it can’t be used.'
		},
	({ licence, licenceNote }) =>
		licence === 'written-permission' &&
		licenceNote === '' && {
			field: 'licenceNote',
			says: 'The permission isn’t described. Say who gave it, when, and for what.'
		},
	({ licence, source }) =>
		licence !== 'own-work' &&
		source === '' && {
			field: 'source',
			says: 'Where it was taken from isn’t said. Give the address, or the archive and its number.'
		},
	({ rightsEnd }, today) =>
		rightsEnd !== '' &&
		rightsEnd < today && {
			field: 'rightsEnd',
			says: `The rights ended on ${rightsEnd}. Renew them and write the new day, or use another picture.`
		},
	({ alt, decorative }) =>
		alt === '' &&
		decorative === '' && {
			field: 'alt',
			says: 'There is no description. Say what it shows, or mark it decorative and say why.'
		},
	({ alt, decorative }) =>
		alt !== '' &&
		decorative !== '' && {
			field: 'decorative',
			says: 'It is described and called decorative at once. Keep one of the two.'
		},
	({ labels }) =>
		labels.length === 0 && {
			field: 'labels',
			says: 'What kind of picture it is isn’t said. Tick all that hold, such as “Artist’s impression” and “Not to scale”.'
		},
	({ labels }) =>
		labels.includes('photograph') &&
		labels.includes('artists-impression') && {
			field: 'labels',
			says: 'It is called a photograph and an artist’s impression. Keep the one that holds.'
		},
	({ people }) =>
		people === '' && {
			field: 'people',
			says: 'Whether people can be recognised isn’t said. Choose “nobody”, or that all of them agreed.'
		},
	({ people, consentNote }) =>
		people === 'consent-given' &&
		consentNote === '' && {
			field: 'consentNote',
			says: 'Where the consent is kept isn’t said. Name who agreed and where it lies.'
		}
];

/**
 * Whether the picture may be placed, and every sentence about what stands in the way. `today` is the day it would be
 * used, as 2026-12-08; without it the end of the rights isn’t looked at.
 */
export function pictureReady(record: PictureRecord, today = ''): Readiness {
	const findings = RULES.map((rule) => rule(record, today)).filter((finding) => finding !== false);
	return { ready: findings.length === 0, findings };
}

/** Days before the end of the rights from which the desk says so. Common practice: two months to find another. */
export const RIGHTS_NOTICE_DAYS = 60;

/** Whole days until the last day, negative once it is over; null when the rights don’t end. Both as 2026-12-08. */
export function rightsDaysLeft({ rightsEnd }: PictureRecord, today: string): number | null {
	if (rightsEnd === '') return null;
	return Math.round((Date.parse(rightsEnd) - Date.parse(today)) / 86_400_000);
}

export function isLicence(licence: string): licence is LicenceId {
	return (LICENCE_IDS as readonly string[]).includes(licence);
}
