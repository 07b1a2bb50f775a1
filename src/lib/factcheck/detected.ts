/** What detection finds. */
import type { Stated } from '../widget/stated.ts';

export type QuantityForm =
	| 'number'
	| 'fraction'
	| 'multiple'
	| 'range'
	| 'percent'
	| 'power'
	| 'uncertainty'
	| 'order-word'
	| 'small-word';

export interface DetectedQuantity {
	/** UTF-16 offsets of `surface`, from the hedge to the unit. */
	start: number;
	end: number;
	surface: string;
	kind: QuantityForm;
	/** In `unit`; null where the words name no one number. */
	value: number | null;
	/** Both ends of a range, in `unit`. */
	ends?: readonly [low: number, high: number];
	/** A symbol of the unit table; '' for a plain number. */
	unit: string;
	/** The hedge as written; '' when bare. */
	hedge: string;
	/** Two hedges on one number, “about up to 15”. */
	doubleHedge: boolean;
	/** What is weighed; null for kinds that no rule in the house weighs yet. */
	stated: Stated | null;
}
