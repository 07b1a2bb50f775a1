/** The order in which the steps on the bench are worked, and what hangs on what. */
import type { ReadingRef, SettingSource, Step } from './document.ts';

export type StepOrder =
	| { ok: true; steps: Step[] }
	| { ok: false; reason: 'cycle'; path: string[] }
	| { ok: false; reason: 'missing'; step: string; missing: string };

/** Steps with each after all that feed it. A ring of steps, or a step that isn't there, is named. */
export function orderSteps(steps: readonly Step[]): StepOrder {
	const byId = new Map(steps.map((step) => [step.id, step]));
	const ordered: Step[] = [];
	const state = new Map<string, 'open' | 'done'>();
	const trail: string[] = [];

	const visit = (step: Step): StepOrder | null => {
		if (state.get(step.id) === 'done') return null;
		if (state.get(step.id) === 'open') {
			return {
				ok: false,
				reason: 'cycle',
				path: [...trail.slice(trail.indexOf(step.id)), step.id]
			};
		}
		state.set(step.id, 'open');
		trail.push(step.id);
		for (const id of feeds(step)) {
			const source = byId.get(id);
			if (!source) return { ok: false, reason: 'missing', step: step.id, missing: id };
			const failure = visit(source);
			if (failure) return failure;
		}
		trail.pop();
		state.set(step.id, 'done');
		ordered.push(step);
		return null;
	};

	for (const step of steps) {
		const failure = visit(step);
		if (failure) return failure;
	}
	return { ok: true, steps: ordered };
}

/** Ids of the steps whose readings a step takes. */
function feeds(step: Step): string[] {
	return Object.values(step.settings).flatMap((source) =>
		source.from === 'reading' ? [source.step] : []
	);
}

export interface Wiring {
	/** In the order they are worked. */
	steps: Step[];
	/** Ids of controls that reach the reading, in order of first use. */
	controls: string[];
}

/** Everything upstream of a reading. Steps that aren't on the bench are left out. */
export function wiringOf(steps: readonly Step[], ref: ReadingRef): Wiring {
	if ('control' in ref) return { steps: [], controls: [ref.control] };
	const byId = new Map(steps.map((step) => [step.id, step]));
	const found = new Map<string, Step>();
	const controls = new Set<string>();

	const visit = (step: Step, only?: SettingSource) => {
		for (const source of only ? [only] : Object.values(step.settings)) {
			if (source.from === 'control') controls.add(source.control);
			const upstream = source.from === 'reading' ? byId.get(source.step) : undefined;
			if (upstream && !found.has(upstream.id)) visit(upstream);
		}
		found.set(step.id, step);
	};

	const step = byId.get(ref.step);
	if (step) visit(step, 'setting' in ref ? step.settings[ref.setting] : undefined);
	return { steps: [...found.values()], controls: [...controls] };
}
