/** What two editions of the constants differ in. */
import type { Constant } from './constant.ts';
import type { ConstantsEdition } from './index.ts';

export interface MovedConstant {
	/** The key that calculators know it by: “m_e”. */
	key: string;
	here: Constant;
	there: Constant;
	/** How much larger it is here, as a share of the value there. */
	relative: number;
	/** The same in standard uncertainties of the value there; null for one that is exact. */
	inUncertainties: number | null;
}

/** The constants whose values differ, in the order of the edition. What is only known better hasn't moved. */
export function movedConstants(here: ConstantsEdition, there: ConstantsEdition): MovedConstant[] {
	return [
		...movedIn(here.physical, there.physical),
		...movedIn(here.astronomical, there.astronomical)
	];
}

function movedIn(
	here: Readonly<Record<string, Constant>>,
	there: Readonly<Record<string, Constant>>
): MovedConstant[] {
	return Object.entries(here).flatMap(([key, constant]): MovedConstant[] => {
		const other = there[key];
		if (!other || other.value === constant.value) return [];
		const move = constant.value - other.value;
		return [
			{
				key,
				here: constant,
				there: other,
				relative: move / other.value,
				inUncertainties: other.uncertainty === 'exact' ? null : move / other.uncertainty
			}
		];
	});
}
