/** Inputs all over a calculator's declared ranges, for property tests. */
import fc from 'fast-check';
import type {
	Calculator,
	InputSpec,
	ListInput,
	RawInputs
} from '../../src/lib/physics/calculator.ts';

/** Every input given; of each either-or group the first one, or `given`. */
export function inputsAllOver(calculator: Calculator, given?: string): fc.Arbitrary<RawInputs> {
	const idle = (calculator.oneOf ?? []).flatMap((group) => {
		const chosen = group.find((key) => key === given) ?? group[0];
		return group.filter((key) => key !== chosen);
	});
	return fc.record(
		Object.fromEntries(
			Object.entries(calculator.inputs)
				.filter(([key]) => !idle.includes(key))
				.map(([key, spec]) => [key, valuesOf(spec)])
		)
	);
}

/** Values that an input takes, its ends among them. */
export function valuesOf(spec: InputSpec): fc.Arbitrary<unknown> {
	switch (spec.kind) {
		case 'choice':
			return fc.constantFrom(...spec.options.map((option) => option.value));
		case 'cosmology':
			return cosmologies;
		case 'decimal':
			return fc.oneof(fc.double(), decimals);
		case 'list':
			return lists(spec);
		case 'number':
			return fc.oneof(
				fc.constantFrom(spec.min, spec.max, spec.initial),
				spec.whole
					? fc.integer({ min: spec.min, max: spec.max })
					: fc.double({ min: spec.min, max: spec.max, noNaN: true })
			);
	}
}

const decimals = fc.stringMatching(/^[+-]?[0-9]{1,6}(\.[0-9]{0,9})?(e[+-]?[0-9]{1,2})?$/);

function lists(spec: ListInput): fc.Arbitrary<unknown> {
	const number = fc.oneof(
		fc.constantFrom(spec.min, spec.max, 0.5, 1),
		fc.double({ min: spec.min, max: spec.max, noNaN: true })
	);
	const length = spec.columns?.length;
	const row = fc.array(number, { minLength: length ?? 1, maxLength: length ?? 3 });
	return fc.oneof(
		fc.constant(spec.initial),
		spec.shape === 'row' ? row : fc.array(row, { minLength: 1, maxLength: 3 })
	);
}

const cosmologies = fc.oneof(
	fc.constantFrom('Planck18', 'Planck15', 'Planck13', 'WMAP9', 'Simple').map((set) => ({ set })),
	fc.record(
		{
			H0: fc.double({ min: 0.1, max: 1000, noNaN: true }),
			Om0: fc.double({ min: 0, max: 10, noNaN: true }),
			Ode0: fc.double({ min: -10, max: 10, noNaN: true }),
			Tcmb0: fc.double({ min: 0, max: 100, noNaN: true }),
			w0: fc.double({ min: -5, max: 1, noNaN: true }),
			wa: fc.double({ min: -5, max: 5, noNaN: true }),
			m_nu: fc.array(fc.double({ min: 0, max: 10, noNaN: true }), { minLength: 1, maxLength: 1 })
		},
		{ requiredKeys: ['H0', 'Om0'] }
	)
);
