/** Imported for its effect where a chart may be drawn in any language. */
import { de } from './de.ts';
import { es } from './es.ts';
import { putOnShelf } from './shelf.ts';

putOnShelf('de', de);
putOnShelf('es', es);
