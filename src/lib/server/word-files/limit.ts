/** The largest word file that is taken in. */
export const WORD_FILE_LIMIT_BYTES = 5 * 1024 * 1024;
