import { defineCalculator, type Computed } from '../../calculator.ts';
import { signalRedshift } from './signal.ts';
import { checksOf } from '../published-checks.ts';

/** A step from 0 to A_ref around z₀: A_ref/2 [1 + tanh((z₀ − z)/Δz)]. */
export const tanh = defineCalculator({
	id: 'g21.tanh',
	revision: '1.0.0',
	title: 'A step in redshift',
	purpose: 'How far has something that switched on around one redshift come by another?',
	asks: ['How ionised is the gas, in a simple model?', 'How does starlight build up?'],
	notFor: ['Physics: this is a shape to fit, nothing more.'],
	inputs: {
		Aref: {
			kind: 'number',
			label: 'Height of the step',
			symbol: 'A_ref',
			quantity: 'number',
			unit: '',
			min: -1e12,
			max: 1e12,
			initial: 1
		},
		z0: { ...signalRedshift(9), label: 'Redshift in the middle of the step', symbol: 'z_0' },
		dz: {
			...signalRedshift(2),
			label: 'Width of the step',
			symbol: 'Δz',
			quantity: 'number',
			minExclusive: true
		},
		z: signalRedshift(8)
	},
	outputs: { A: { label: 'Height reached', symbol: 'A', quantity: 'number', unit: '' } },
	equations: [
		{
			tex: 'A = \\frac{A_\\mathrm{ref}}{2}\\left[1+\\tanh\\frac{z_0-z}{\\Delta z}\\right]',
			says: 'Half of the height at the middle, nearly all or nothing a few widths away.'
		}
	],
	assumptions: [
		'One smooth step, the same to both sides. The height keeps whatever unit it was given in.'
	],
	warnings: [],
	sources: [
		{ title: 'Mirocha, Harker & Burns 2015, ApJ 813, 11', fromMemory: true },
		{ title: 'Harker et al. 2016, MNRAS 455, 3829', fromMemory: true }
	],
	checks: checksOf('g21.tanh'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ Aref, z0, dz, z }): Computed {
		// 1 + tanh x loses its digits far before the step; 2/(1 + e^(−2x)) doesn't.
		const values = { A: Aref / (1 + Math.exp((-2 * (z0 - z)) / dz)) };
		return { ok: true, values, uncertainties: 'exact' };
	}
});
