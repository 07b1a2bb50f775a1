/** Trap 20: wavelengths in air and in vacuum mixed. They differ by about one part in 3600. */
import type { Line } from '../../physics/lines/catalogue.ts';
import { commensurable } from '../../physics/units/units.ts';
import type { Stated } from '../../widget/stated.ts';
import { fits, type Trap } from './trap.ts';

export type Column = 'air' | 'vacuum';

const NAMES: Record<Column, string> = { air: 'in air', vacuum: 'in vacuum' };

/** Which of a line’s two wavelengths the number is; null for both (too few digits to tell), neither, or no wavelength. */
export function columnOf(stated: Stated, line: Line): Column | null {
	if (line.airWavelengthNm === null || !commensurable(stated.unit, 'nm')) return null;
	const air = fits(stated, line.airWavelengthNm, 'nm');
	const vacuum = fits(stated, line.vacuumWavelengthNm, 'nm');
	if (air === vacuum) return null;
	return air ? 'air' : 'vacuum';
}

/** The number is the line’s wavelength in the other medium than the copy means. */
export function otherColumn(stated: Stated, line: Line, meant: Column): Trap | null {
	const found = columnOf(stated, line);
	if (found === null || found === meant) return null;
	return {
		code: 'other-column',
		says: `This is the wavelength of ${line.label} ${NAMES[found]}; the copy means it ${NAMES[meant]}. Change the number, or say which it is.`,
		matches: [matchOf(line, found), matchOf(line, meant)]
	};
}

/** One list, lines of both sorts: each is right by itself, and together they mislead. */
export function mixedColumns(list: readonly { stated: Stated; line: Line }[]): Trap | null {
	const told = list.flatMap(({ stated, line }) => {
		const column = columnOf(stated, line);
		return column ? [{ line, column }] : [];
	});
	const inAir = told.filter(({ column }) => column === 'air');
	const inVacuum = told.filter(({ column }) => column === 'vacuum');
	if (inAir.length === 0 || inVacuum.length === 0) return null;
	const labels = (some: typeof told) => some.map(({ line }) => line.label).join(', ');
	return {
		code: 'mixed-columns',
		says: `This list mixes wavelengths in air (${labels(inAir)}) and in vacuum (${labels(inVacuum)}). Give all in one, and say which.`,
		matches: told.map(({ line, column }) => matchOf(line, column))
	};
}

function matchOf(line: Line, column: Column) {
	const value = column === 'air' ? line.airWavelengthNm! : line.vacuumWavelengthNm;
	return {
		key: `${line.id} ${column}`,
		label: `${line.label} ${NAMES[column]}`,
		value,
		unit: 'nm'
	};
}
