/** One constant as published. `uncertainty` is the standard uncertainty in the constant's own unit. */
export interface Constant {
	name: string;
	value: number;
	unit: string;
	uncertainty: number | 'exact';
	source: string;
	/** Recalled and not read again from the publication. */
	fromMemory?: boolean;
}
