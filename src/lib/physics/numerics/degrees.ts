/** Sine of an angle in degrees. */
export function sineOfDegrees(angle: number): number {
	return Math.sin((angle * Math.PI) / 180);
}

/** Cosine of an angle in degrees, as the sine of its complement: a right angle gives 0 and nothing else. */
export function cosineOfDegrees(angle: number): number {
	return sineOfDegrees(90 - Math.abs(angle));
}
