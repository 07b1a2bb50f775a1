/** Shown, always, beside any reading about a thing that throws. */
export const LAUNCHER_CAUTION =
	'Don’t build one from this. Launchers injure people. Follow local rules, and work under qualified supervision.';
