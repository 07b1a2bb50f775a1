/**
 * JSON lines in, JSON lines out: `{"hedge": "nearly", "numeral": "14", "scale": 1e9, "value": 1.3787e10, "u": 2e7}` or a
 * sentence, `{"lang": "en", "text": "nearly 14 billion years", "value": 13.787, "unit": "Gyr", "u": 0.02}`, gives the
 * verdict. With `--detect`, `{"lang": "en", "text": "…"}` gives the quantities found.
 */
import { answerLines } from './json-lines.ts';
import { detectLine, weighLine } from './weigh-line.ts';

await answerLines(process.argv.includes('--detect') ? detectLine : weighLine);
