/** Imported for its effect where any language may be printed at any time: on the server and in the commands. */
import { german } from './de.ts';
import { spanish } from './es.ts';
import { putOnShelf } from './print-words.ts';

putOnShelf(german);
putOnShelf(spanish);
