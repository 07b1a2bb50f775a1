import { EDITION_IN_USE } from '../physics/constants/index.ts';
import { DOCUMENT_VERSION, type WidgetDocument } from './document.ts';

/** An empty sheet under this title, in the constants edition that is in use. */
export function emptyDocument(title: string): WidgetDocument {
	return {
		version: DOCUMENT_VERSION,
		language: 'en',
		constants: EDITION_IN_USE,
		title,
		point: '',
		formulas: [],
		steps: [],
		controls: [],
		blocks: [],
		claims: []
	};
}
