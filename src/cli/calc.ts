/**
 * JSON lines in, JSON lines out: `{"calculator": "line.band", "inputs": {"wavelength_nm": 550}}` on standard input gives
 * one answer a line on standard output; a line that can't be read is refused by itself.
 */
import { calculate, type CalculationAnswer } from '../lib/api/calculation.ts';
import { answerLines } from './json-lines.ts';

await answerLines((line) => {
	let request: unknown;
	try {
		request = JSON.parse(line);
	} catch {
		return refused('not-json', 'This line is not JSON. Send one whole object on each line.');
	}
	return calculate(request);
}, refused);

function refused(code: string, message: string): CalculationAnswer {
	return { refused: { code, message } };
}
