/** The manuscript travels to the parts of its page by context. */
import { createContext } from 'svelte';
import type { Manuscript } from './manuscript.svelte.ts';

export const [getManuscript, setManuscript] = createContext<Manuscript>();
