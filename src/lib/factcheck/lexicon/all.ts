/** Imported for its effect where every language may be asked for at any time: on the server and in the commands. */
import '../../widget/languages/all.ts';
import { german } from './de.ts';
import { putOnShelf } from './shelf.ts';
import { spanish } from './es.ts';

putOnShelf(german);
putOnShelf(spanish);
