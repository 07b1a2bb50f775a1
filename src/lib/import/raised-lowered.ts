/** Superscripts and subscripts as characters of their own, so that 10²⁴ keeps its meaning in plain text. */
const RAISED = spell('0123456789+-−–=()nix', '⁰¹²³⁴⁵⁶⁷⁸⁹⁺⁻⁻⁻⁼⁽⁾ⁿⁱˣ');
const LOWERED = spell('0123456789+-−–=()aeoxhklmnpst', '₀₁₂₃₄₅₆₇₈₉₊₋₋₋₌₍₎ₐₑₒₓₕₖₗₘₙₚₛₜ');

function spell(from: string, to: string): ReadonlyMap<string, string> {
	const targets = [...to];
	return new Map([...from].map((character, index) => [character, targets[index] ?? character]));
}

/** Where a character has no such form the words stay as they are. */
export function raised(text: string): string {
	return respell(text, RAISED);
}

export function lowered(text: string): string {
	return respell(text, LOWERED);
}

function respell(text: string, by: ReadonlyMap<string, string>): string {
	const characters = [...text];
	const all = characters.every((character) => by.has(character));
	return all ? characters.map((character) => by.get(character)).join('') : text;
}
