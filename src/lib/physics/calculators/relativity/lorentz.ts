/** Lorentz factors in forms that keep their digits both at small speeds and close to that of light. */

/** γ = 1/√(1−β²), with the two factors of 1 − β² apart. */
export function lorentzFactor(beta: number): number {
	return 1 / Math.sqrt((1 - beta) * (1 + beta));
}

/** γ − 1 as β²γ²/(γ+1). */
export function lessOne(beta: number): number {
	const gamma = lorentzFactor(beta);
	return (beta * gamma * (beta * gamma)) / (gamma + 1);
}
