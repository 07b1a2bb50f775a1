import { defineCalculator, refuse, type Computed, type NumberInput } from '../../calculator.ts';
import { GL64 } from '../../numerics/quadrature.ts';
import { checksOf } from '../published-checks.ts';
import {
	BLACK_BODY_ASSUMPTIONS,
	HC_OVER_K_NM,
	NOT_BLACK,
	PLANCK_SOURCES,
	temperatureInput
} from './radiation.ts';

/** Where the integral over hν/kT is cut into pieces that 64 nodes take to the last bits; nothing is left past the end. */
const CUTS = [2, 5, 10, 20, 40, 80, 160, 320, 740];
const END = 740;

function edge(label: string, symbol: string, min: number, initial: number): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity: 'wavelength',
		unit: 'nm',
		min,
		max: 1e18,
		initial
	};
}

/**
 * Share of a black body's power between two wavelengths in nm: (15/π⁴) ∫ t³/(eᵗ − 1) dt over t = hc/λkT. A band from
 * 0 holds all shorter waves. Refuses a band that ends before it begins.
 */
export const bandFraction = defineCalculator({
	id: 'blackbody.band_fraction',
	revision: '1.0.0',
	title: 'Share of the glow in a band',
	purpose: 'How much of a hot body’s power lies between two wavelengths?',
	asks: ['How much of sunlight is visible?', 'How much of a lamp’s power is heat?'],
	notFor: ['What gets through air or glass.', 'How bright it looks to an eye.'],
	inputs: {
		T_K: temperatureInput,
		from_nm: edge('Shortest wavelength', 'λ_1', 0, 380),
		to_nm: edge('Longest wavelength', 'λ_2', 1e-6, 760)
	},
	outputs: {
		fraction: { label: 'Share of the whole power', symbol: 'f', quantity: 'fraction', unit: '' }
	},
	equations: [
		{
			tex: 'f = \\frac{15}{\\pi^4}\\int_{hc/\\lambda_2 kT}^{hc/\\lambda_1 kT}\\frac{t^3}{e^t-1}\\,dt',
			says: 'The part of the curve between the two wavelengths, as a share of all of it.'
		}
	],
	assumptions: BLACK_BODY_ASSUMPTIONS,
	warnings: [NOT_BLACK],
	sources: PLANCK_SOURCES,
	checks: checksOf('blackbody.band_fraction'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ T_K: T, from_nm, to_nm }): Computed {
		if (from_nm >= to_nm) {
			return refuse(
				'empty-band',
				'The band ends before it begins. Give a longest wavelength above the shortest.',
				'to_nm'
			);
		}
		const low = HC_OVER_K_NM / (to_nm * T);
		// The width from the wavelengths' difference: a narrow band keeps its digits.
		const width = (HC_OVER_K_NM / (to_nm * T)) * ((to_nm - from_nm) / from_nm);
		const values = { fraction: low < END ? shareOf(low, Math.min(width, END - low)) : 0 };
		return { ok: true, values, uncertainties: 'exact', warnings: [NOT_BLACK.code] };
	}
});

/** (15/π⁴) ∫ t³/(eᵗ − 1) dt over a stretch of this width. */
function shareOf(low: number, width: number): number {
	const steps = [0, ...CUTS.map((cut) => cut - low).filter((at) => at > 0 && at < width), width];
	let sum = 0;
	for (const [index, from] of steps.slice(0, -1).entries()) {
		const piece = (steps[index + 1] ?? width) - from;
		for (const { at, weight } of GL64) {
			const t = low + from + piece * at;
			sum += weight * piece * (t ** 3 / Math.expm1(t));
		}
	}
	return Math.min(1, (15 / Math.PI ** 4) * sum);
}
