import { defineCalculator, type Computed } from '../../calculator.ts';
import { kelvin } from './signal.ts';
import { checksOf } from '../published-checks.ts';

/** Listening time until thermal noise has fallen to `rms`: (T_sys/rms)²/B, in s and h. */
export const radiometer = defineCalculator({
	id: 'g21.radiometer',
	revision: '1.0.0',
	title: 'Listening time',
	purpose: 'How long must a receiver listen until its noise has sunk to a wanted level?',
	asks: ['How long does it take to hear the signal?', 'How does noise fall with time?'],
	notFor: ['Anything but thermal noise, which is seldom what sets the limit.'],
	inputs: {
		Tsys_K: kelvin('Temperature of sky and receiver', 'T_sys', 'temperature', 1700),
		rms_K: kelvin('Noise wanted', 'σ', 'temperature-difference', 0.02),
		bandwidth_Hz: {
			kind: 'number',
			label: 'Width of a channel',
			symbol: 'B',
			quantity: 'bandwidth',
			unit: 'Hz',
			min: 0,
			minExclusive: true,
			max: 1e12,
			initial: 4e5,
			log: true
		}
	},
	outputs: {
		time: { label: 'Listening time', symbol: 't', quantity: 'duration', unit: 's' },
		time_h: { label: 'Listening time, in hours', symbol: 't', quantity: 'duration', unit: 'h' }
	},
	equations: [
		{
			tex: 't = \\frac{1}{B}\\left(\\frac{T_\\mathrm{sys}}{\\sigma}\\right)^2',
			says: 'Half the noise takes four times as long.'
		}
	],
	assumptions: ['One antenna and one polarisation, listening all the time.'],
	warnings: [
		{
			code: 'thermal-only',
			message:
				'Thermal noise only: the sky in front, the antenna and interference set the limit long before it does.',
			when: 'always',
			validity: 'ok'
		}
	],
	sources: [
		{
			title:
				'Dicke 1946, The measurement of thermal radiation at microwave frequencies, Rev. Sci. Instrum. 17, 268',
			doi: '10.1063/1.1770483',
			fromMemory: true
		}
	],
	checks: checksOf('g21.radiometer'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ Tsys_K, rms_K, bandwidth_Hz }): Computed {
		const time = (Tsys_K / rms_K) ** 2 / bandwidth_Hz;
		const values = { time, time_h: time / 3600 };
		return { ok: true, values, uncertainties: 'exact', warnings: ['thermal-only'] };
	}
});
