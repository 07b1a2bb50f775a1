/** What the office's own views of a widget bring, where nothing has been printed yet: equations and pictures. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { fileNameOf } from '../pictures/address.ts';
import type { OfficeParts } from '../renderer/live-widget.svelte.ts';
import { routes } from '../routes.ts';
import { OfficeMath } from './office-math.svelte.ts';

export function officeParts(calculators: () => CalculatorSet): OfficeParts {
	const math = new OfficeMath(calculators);
	return {
		math: (key) => math.get(key),
		pictureAddress: (file) => routes.api.pictureFile(fileNameOf(file))
	};
}
