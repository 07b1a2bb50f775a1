/** The `cosmology` input: `{ set: 'Planck18' }` with any parameter overridden, or H0 and Om0 with the rest by default. */
import { refuse, type NumberInput, type Refusal } from '../../calculator.ts';
import { constants, type CosmologySetName } from '../../constants/index.ts';
import { nearestOf } from '../nearest.ts';
import { printNumber } from '../wording.ts';

export interface CosmologyParameters {
	/** The published set these are, untouched; null as soon as one parameter differs. */
	set: CosmologySetName | null;
	/** km/s/Mpc */
	H0: number;
	Om0: number;
	/** null: exactly flat, and dark energy takes what is left. */
	Ode0: number | null;
	/** K */
	Tcmb0: number;
	Neff: number;
	/** eV, one for each of floor(Neff) species. */
	m_nu: readonly number[];
	w0: number;
	wa: number;
	Ob0: number;
}

type ParameterInput = Omit<NumberInput, 'kind'> & { kind: 'number' };

function parameter(
	label: string,
	symbol: string,
	quantity: NumberInput['quantity'],
	unit: string,
	[min, max, initial]: [number, number, number],
	minExclusive = false
): ParameterInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity,
		unit,
		min,
		max,
		initial,
		minExclusive,
		optional: true
	};
}

/** What may be overridden one by one (`cosmology.H0` on the bench), with hard limits. */
export const COSMOLOGY_PARAMETERS = {
	H0: parameter('Expansion rate now', 'H₀', 'expansion-rate', 'km/s/Mpc', [0, 1000, 67.66], true),
	Om0: parameter('Matter now, without neutrinos', 'Ωₘ', 'density-share', '', [0, 10, 0.30966]),
	Ode0: parameter('Dark energy now', 'Ω_DE', 'density-share', '', [-10, 10, 0.6888]),
	Tcmb0: parameter('Temperature of the background now', 'T₀', 'temperature', 'K', [0, 100, 2.7255]),
	Neff: parameter('Effective number of neutrino species', 'N_eff', 'number', '', [0, 20, 3.046]),
	w0: parameter('Dark-energy pressure now', 'w₀', 'ratio', '', [-5, 1, -1]),
	wa: parameter('Change of the dark-energy pressure', 'wₐ', 'ratio', '', [-5, 5, 0]),
	Ob0: parameter('Ordinary matter now', 'Ω_b', 'density-share', '', [0, 10, 0.04897])
} as const;

type ParameterKey = keyof typeof COSMOLOGY_PARAMETERS;
const NUMERIC = Object.keys(COSMOLOGY_PARAMETERS) as ParameterKey[];
const KEYS = ['set', 'm_nu', ...NUMERIC];
const HEAVIEST_NEUTRINO_EV = 1000;

type Resolved = { ok: true; value: CosmologyParameters } | { ok: false; refusal: Refusal };

/** Checks a raw cosmology and fills what it leaves out. `input` is the key named in a refusal. */
export function resolveCosmology(raw: unknown, input = 'cosmology'): Resolved {
	const no = (code: string, message: string): Resolved => refuse(code, message, input);
	if (typeof raw !== 'object' || raw === null || Array.isArray(raw)) {
		return no(
			'cosmology-broken',
			'A cosmology is an object such as {"set": "Planck18"}, or gives H0 and Om0.'
		);
	}
	const given = raw as Record<string, unknown>;
	const keys = Object.keys(given);
	const untouched = keys.length === 1 && typeof given.set === 'string' && wholeSets.get(given.set);
	if (untouched) return untouched;
	for (const key of keys) {
		if (KEYS.includes(key)) continue;
		const near = nearestOf(key, KEYS);
		const hint = near ? `Did you mean “${near}”?` : `It takes ${KEYS.join(', ')}.`;
		return no('unknown-parameter', `A cosmology has no parameter “${key.slice(0, 40)}”. ${hint}`);
	}

	const base = baseOf(given, no);
	if (!base.ok) return base;
	const parameters = { ...base.value };
	for (const key of NUMERIC) {
		const value = given[key];
		if (value === undefined || value === null) continue;
		const spec = COSMOLOGY_PARAMETERS[key];
		if (typeof value !== 'number' || !Number.isFinite(value)) {
			return no(
				'parameter-not-a-number',
				`${spec.label} (${key}) must be a finite number, without quotes or unit.`
			);
		}
		if (value > spec.max || value < spec.min || (spec.minExclusive && value <= spec.min)) {
			const low = `${spec.minExclusive ? 'more than' : 'at least'} ${printNumber(spec.min)}`;
			return no(
				'parameter-out-of-range',
				`${spec.label} (${key}) must be ${low} and at most ${printNumber(spec.max)}; ${printNumber(value)} was given.`
			);
		}
		if (parameters[key] !== value) parameters.set = null;
		parameters[key] = value;
	}
	const resolved = withNeutrinos(parameters, given.m_nu, no);
	if (keys.length === 1 && resolved.ok && resolved.value.set !== null)
		wholeSets.set(resolved.value.set, resolved);
	return resolved;
}

/** Sets as published, by name: by far the most common universes. */
const wholeSets = new Map<string, Resolved>();

/** The parameters before any override: those of the set, or the defaults beside H0 and Om0. */
function baseOf(
	given: Record<string, unknown>,
	no: (code: string, message: string) => Resolved
): Resolved {
	const { cosmologies } = constants;
	if (given.set !== undefined && given.set !== null) {
		if (typeof given.set !== 'string' || !Object.hasOwn(cosmologies, given.set)) {
			const names = Object.keys(cosmologies);
			const near = typeof given.set === 'string' ? nearestOf(given.set, names) : undefined;
			const hint = near ? `Did you mean “${near}”?` : `Choose one of ${names.join(', ')}.`;
			return no('unknown-set', `There is no parameter set of that name. ${hint}`);
		}
		const name = given.set as CosmologySetName;
		const { H0, Om0, Ob0, Tcmb0, Neff, m_nu } = cosmologies[name];
		return {
			ok: true,
			value: { set: name, H0, Om0, Ob0, Tcmb0, Neff, m_nu, Ode0: null, w0: -1, wa: 0 }
		};
	}
	for (const key of ['H0', 'Om0'] as const) {
		if (given[key] === undefined || given[key] === null) {
			return no(
				'parameter-missing',
				`Without a set, a cosmology needs ${key}. Give it, or name a set such as “Planck18”.`
			);
		}
	}
	return {
		ok: true,
		value: {
			set: null,
			H0: NaN,
			Om0: NaN,
			Ode0: null,
			Tcmb0: 0,
			Neff: 3.046,
			m_nu: [0],
			w0: -1,
			wa: 0,
			Ob0: 0
		}
	};
}

/** One mass stands for all species; a longer list names each of the floor(Neff) species. */
function withNeutrinos(
	parameters: CosmologyParameters,
	raw: unknown,
	no: (code: string, message: string) => Resolved
): Resolved {
	const species = Math.floor(parameters.Neff);
	let masses = parameters.m_nu;
	if (raw !== undefined && raw !== null) {
		const list: unknown[] = Array.isArray(raw) ? raw : [];
		if (
			list.length === 0 ||
			!list.every((mass) => typeof mass === 'number' && Number.isFinite(mass))
		) {
			return no(
				'parameter-not-a-number',
				'Neutrino masses (m_nu) are a list of numbers in eV, such as [0, 0, 0.06].'
			);
		}
		masses = list as number[];
		if (masses.some((mass) => mass < 0 || mass > HEAVIEST_NEUTRINO_EV)) {
			return no(
				'parameter-out-of-range',
				`Each neutrino mass (m_nu) must be at least 0 and at most ${HEAVIEST_NEUTRINO_EV} eV.`
			);
		}
	}
	const sameAsSet = sameList(masses, parameters.m_nu);
	// Without radiation there are no neutrinos, whatever the list says.
	const full =
		species === 0 || parameters.Tcmb0 === 0
			? []
			: masses.length === 1
				? new Array<number>(species).fill(masses[0] ?? 0)
				: masses;
	if (full.length !== 0 && full.length !== species) {
		return no(
			'neutrino-count',
			`Neff ${printNumber(parameters.Neff)} means ${species} species of neutrino; give ${species} masses (m_nu), or one for all.`
		);
	}
	return { ok: true, value: { ...parameters, m_nu: full, set: sameAsSet ? parameters.set : null } };
}

function sameList(a: readonly number[], b: readonly number[]): boolean {
	return a.length === b.length && a.every((value, index) => value === b[index]);
}
