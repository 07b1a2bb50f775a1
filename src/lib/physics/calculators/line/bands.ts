/** Parts of the spectrum by vacuum wavelength in nm, [from, to). */
export interface Band {
	name: string;
	from: number;
	to: number;
}

const RADIO: Band = { name: 'radio', from: 3e8, to: Infinity };

/** Visible: ISO 21348:2007 (from memory). The other limits are astronomers' conventions and differ between texts. */
export const BANDS: readonly Band[] = [
	{ name: 'gamma ray', from: 0, to: 0.01 },
	{ name: 'X-ray', from: 0.01, to: 10 },
	{ name: 'ultraviolet', from: 10, to: 380 },
	{ name: 'visible', from: 380, to: 760 },
	{ name: 'near-infrared', from: 760, to: 5000 },
	{ name: 'mid-infrared', from: 5000, to: 40_000 },
	{ name: 'far-infrared', from: 40_000, to: 350_000 },
	{ name: 'submillimetre', from: 350_000, to: 1e6 },
	{ name: 'radio (microwave)', from: 1e6, to: 3e8 },
	RADIO
];

export function bandOf(wavelengthNm: number): Band {
	return BANDS.find((band) => wavelengthNm < band.to) ?? RADIO;
}

/** Wavelengths the air above a telescope on the ground lets little of through, nm; rough, from memory of survey texts. */
const OPAQUE: readonly { from: number; to: number }[] = [
	{ from: 0, to: 300 },
	{ from: 5500, to: 7500 },
	{ from: 14_500, to: 16_500 },
	{ from: 28_000, to: 300_000 },
	{ from: 3e10, to: Infinity }
];

export function isBlockedByAir(wavelengthNm: number): boolean {
	for (const { from, to } of OPAQUE) if (wavelengthNm >= from && wavelengthNm < to) return true;
	return false;
}
