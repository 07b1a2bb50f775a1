/** The outcome of weighing one claim against one reading. */

export const VERDICTS = ['level', 'leans', 'tips', 'unweighed'] as const;
export type VerdictName = (typeof VERDICTS)[number];

export const SEVERITIES = ['none', 'note', 'ask', 'block'] as const;
export type Severity = (typeof SEVERITIES)[number];

export interface Verdict {
	verdict: VerdictName;
	severity: Severity;
	/** N1 … N9, or '' when unweighed. */
	rule: string;
	/** One sentence, no full stop missing, blaming no one. */
	reason: string;
	/** (x − v)/|v| in per cent, signed; null when there is no number to compare. */
	departurePercent: number | null;
	/** Wordings that would be level, best first; at most three. */
	suggestions: string[];
}
