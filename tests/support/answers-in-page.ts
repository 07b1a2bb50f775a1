/** Entry of the page’s script: one function that runs any calculator on any inputs. */
import { catalogue } from '../../src/lib/physics/calculators/index.ts';
import { runCalculator } from '../../src/lib/physics/calculators/run.ts';
import type { AnsweringPage } from './calculators-in-page.ts';

const answering: AnsweringPage = {
	answerAll: (questions) =>
		questions.map(({ calculator, inputs }) => {
			const found = catalogue.get(calculator);
			if (!found) throw new Error(`There is no calculator “${calculator}”.`);
			return runCalculator(found, inputs);
		})
};

Object.assign(globalThis, answering);
