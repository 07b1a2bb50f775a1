/** Languages that copy can be written in: each has its lexicon for the fact-check and its words for print. */
export const LANGUAGES = ['en', 'de', 'es'] as const;
export type Language = (typeof LANGUAGES)[number];
