/** One constant as published. `uncertainty` is the standard uncertainty in the constant's own unit. */
export interface Constant {
	name: string;
	value: number;
	unit: string;
	uncertainty: number | 'exact';
	source: string;
	/** How far the value was checked, where the edition's own word for it doesn't hold. */
	verification?: string;
}

/** A constant that another adjustment may give another value: what is exact stays exact, what is measured measured. */
export type Adjusted<C extends Constant> = Omit<Constant, 'uncertainty'> & {
	uncertainty: C['uncertainty'] extends 'exact' ? 'exact' : number;
};
