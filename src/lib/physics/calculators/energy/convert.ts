import { defineCalculator, type Computed } from '../../calculator.ts';
import { codata2018 } from '../../constants/codata-2018.ts';
import { constants } from '../../constants/index.ts';
import { convert as convertUnits, unitOf } from '../../units/units.ts';
import { checksOf } from '../published-checks.ts';

const ENERGY_UNITS = [
	'J', 'kJ', 'MJ', 'GJ', 'Wh', 'kWh', 'cal', 'kcal', 'kcalIT', 'gTNT', 'tTNT', 'ktTNT', 'MtTNT', 'kt', 'Mt',
	'eV', 'keV', 'MeV', 'GeV', 'erg', 'Btu_IT', 'ftlbf', 'hartree', 'foe', 'kgmc2'
]; // prettier-ignore

const options = ENERGY_UNITS.map((symbol) => ({
	value: symbol,
	label: unitOf(symbol)?.words.many ?? symbol
}));
const sameUnit = Object.fromEntries(ENERGY_UNITS.map((symbol) => [symbol, symbol]));

/** An energy stated in another unit. All factors are exact but the hartree, which is measured. */
export const convert = defineCalculator({
	id: 'energy.convert',
	revision: '1.0.0',
	title: 'Energy in other units',
	purpose: 'How much is an energy in a unit a reader knows?',
	asks: [
		'How many kilowatt hours is this?',
		'How many tonnes of TNT is this?',
		'How much energy is in a kilogram of matter?'
	],
	notFor: ['Power, which is energy for each second.', 'What an explosion of that energy does.'],
	inputs: {
		value: {
			kind: 'number',
			label: 'Energy',
			symbol: 'E',
			quantity: 'energy',
			unit: { by: 'from', units: sameUnit },
			min: -1e300,
			max: 1e300,
			initial: 1
		},
		from: { kind: 'choice', label: 'Unit it is in', options, initial: 'kWh' },
		to: { kind: 'choice', label: 'Unit wanted', options, initial: 'J' }
	},
	outputs: {
		value: {
			label: 'The same energy',
			symbol: 'E',
			quantity: 'energy',
			unit: { by: 'to', units: sameUnit }
		}
	},
	equations: [
		{
			tex: '1\\,\\mathrm{kWh} = 3.6\\times10^{6}\\,\\mathrm{J}',
			says: 'A kilowatt hour is a thousand watts for an hour.'
		},
		{
			tex: '1\\,\\mathrm{t\\,TNT} = 4.184\\times10^{9}\\,\\mathrm{J}',
			says: 'A tonne of TNT is a convention: a thousand million calories.'
		},
		{ tex: 'E = m c^2', says: 'A kilogram turned wholly into energy is the most there is.' }
	],
	assumptions: [
		'A ton of TNT is 4.184 gigajoules by convention; measured explosions scatter around it.',
		'Calories are thermochemical unless marked International Table; a food Calorie is a kilocalorie.'
	],
	warnings: [],
	sources: [
		{ title: 'BIPM, The International System of Units (SI Brochure), 9th edition, 2019' },
		{
			title: 'NIST Special Publication 811 (2008)',
			locator: 'appendix B.8',
			doi: '10.6028/NIST.SP.811e2008'
		},
		{
			title: 'CODATA 2018: Tiesinga et al. 2021, Rev. Mod. Phys. 93, 025010',
			locator: 'hartree',
			doi: '10.1103/RevModPhys.93.025010'
		}
	],
	checks: checksOf('energy.convert'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	followsEdition: true,
	compute({ value: given, from, to }, { physical: { R_inf } } = constants): Computed {
		if (from === to) return { ok: true, values: { value: given }, uncertainties: 'exact' };
		// The table's hartree is of CODATA 2018: 2R∞hc, of which an adjustment moves the Rydberg constant alone.
		const hartree = R_inf.value / codata2018.R_inf.value;
		const value =
			(convertUnits(given, from, to) * (from === 'hartree' ? hartree : 1)) /
			(to === 'hartree' ? hartree : 1);
		const isMeasured = from === 'hartree' || to === 'hartree';
		return {
			ok: true,
			values: { value },
			uncertainties: {
				value: isMeasured ? Math.abs(value) * (R_inf.uncertainty / R_inf.value) : 'exact'
			}
		};
	}
});
