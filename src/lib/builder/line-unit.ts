/** The unit of the table that a catalogue line is given in by its source. */
import type { Line } from '../physics/lines/catalogue.ts';

export const LINE_UNITS: Record<Line['nativeUnit'], string> = {
	MHz: 'MHz',
	GHz: 'GHz',
	eV: 'eV',
	nm_vac: 'nm',
	nm_air: 'nm',
	um_vac: 'nm'
};
