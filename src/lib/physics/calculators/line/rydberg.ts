import { defineCalculator, refuse, type Computed, type NumberInput } from '../../calculator.ts';
import { codata2018 } from '../../constants/codata-2018.ts';
import { constants } from '../../constants/index.ts';
import { codata2018 as codata2018Source } from '../sources.ts';
import { checksOf } from '../published-checks.ts';

const MOST_LEVELS = 1000;

function level(label: string, symbol: string, min: number, initial: number): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity: 'number',
		unit: '',
		min,
		max: MOST_LEVELS,
		initial
	};
}

/**
 * Vacuum wavelength in nm of the light of an ion with a single electron that falls from one level to another:
 * 1/λ = R∞Z²/(1 + mₑ/M) (1/n₁² − 1/n₂²). Level 0 above stands for an electron that comes from outside.
 * Without fine structure. Refuses levels that aren't whole numbers, or an upper one that isn't above the lower.
 */
export const rydberg = defineCalculator({
	id: 'line.rydberg',
	revision: '1.0.0',
	title: 'Hydrogen lines from its levels',
	purpose: 'An electron falls between two levels of hydrogen or a like ion: which light comes out?',
	asks: [
		'Where do the lines of hydrogen come from?',
		'What is the wavelength of the step from level 3 to level 2?',
		'What light can strip hydrogen of its electron?'
	],
	notFor: ['Atoms with more than one electron.', 'More than five digits: use the line catalogue.'],
	inputs: {
		nLower: level('Lower level', 'n_1', 1, 2),
		nUpper: level('Upper level; 0 for an electron from outside', 'n_2', 0, 3),
		Z: {
			kind: 'number',
			label: 'Charge of the nucleus',
			symbol: 'Z',
			quantity: 'number',
			unit: '',
			min: 1,
			max: 137,
			good: { min: 1, max: 20, warning: 'heavy-ion' },
			initial: 1,
			optional: true
		},
		nucleusMass_kg: {
			kind: 'number',
			label: 'Mass of the nucleus',
			symbol: 'M',
			quantity: 'mass',
			unit: 'kg',
			min: codata2018.m_e.value,
			max: 1e-24,
			initial: codata2018.m_p.value,
			optional: true,
			absent: 'a proton',
			log: true
		}
	},
	outputs: {
		wavelength: {
			label: 'Wavelength in vacuum',
			symbol: 'λ',
			quantity: 'wavelength',
			unit: 'nm'
		}
	},
	equations: [
		{
			tex: '\\frac1\\lambda = \\frac{R_\\infty Z^2}{1+m_e/M}\\left(\\frac1{n_1^2}-\\frac1{n_2^2}\\right)',
			says: 'The energy between two levels goes into one photon; the nucleus moves a little too.'
		}
	],
	assumptions: [
		'One electron, and no fine structure, no relativity and no outer fields.',
		'Left out, the nucleus is a proton.'
	],
	warnings: [
		{
			code: 'no-fine-structure',
			message:
				'Fine structure is left out: real lines differ by about 1 part in 100 000, and more for heavier ions.',
			when: 'always',
			validity: 'ok'
		},
		{
			code: 'heavy-ion',
			message: 'In so strong a field relativity shifts the levels by a per cent and more.',
			when: 'nuclear charge above 20',
			validity: 'approximate'
		}
	],
	sources: [
		codata2018Source('R∞, mₑ, m_p'),
		{
			title: 'Bohr 1913, On the constitution of atoms and molecules, Phil. Mag. 26, 1',
			doi: '10.1080/14786441308634955',
			fromMemory: true
		}
	],
	checks: checksOf('line.rydberg'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	followsEdition: true,
	compute({ nLower, nUpper, Z, nucleusMass_kg }, { physical } = constants): Computed {
		const { R_inf, m_e, m_p } = physical;
		const M = nucleusMass_kg ?? m_p.value;
		for (const [key, value] of Object.entries({ nLower, nUpper, Z })) {
			if (!Number.isInteger(value)) {
				return refuse('not-whole', 'Levels and charges are whole numbers. Give one.', key);
			}
		}
		if (nUpper !== 0 && nUpper <= nLower) {
			return refuse(
				'no-fall',
				'Light comes out of a fall: the upper level must be above the lower, or 0 for an electron from outside.',
				'nUpper'
			);
		}
		const rydbergOfIon = (R_inf.value * Z * Z) / (1 + m_e.value / M);
		const lower = nLower * nLower;
		// (1/n₁² − 1/n₂²)⁻¹ as one fraction of whole numbers, which keeps its digits for high levels.
		const upper = nUpper * nUpper;
		const inverse =
			nUpper === 0 ? lower : (lower * upper) / ((nUpper - nLower) * (nUpper + nLower));
		// What is left out is far larger than what the constants are uncertain by, so no uncertainty is claimed.
		return {
			ok: true,
			values: { wavelength: (inverse / rydbergOfIon) * 1e9 },
			warnings: ['no-fine-structure']
		};
	}
});
