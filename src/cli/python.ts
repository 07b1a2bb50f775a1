/** Finds a Python that has astropy and scipy. Debian’s own comes first: its packages belong to it alone. */
import { spawnSync } from 'node:child_process';

const CANDIDATES = ['/usr/bin/python3', 'python3'];

export const HOW_TO_INSTALL =
	'On Debian: apt-get install python3-astropy python3-scipy. Elsewhere: a python3 on the PATH that can import both.';

/** Path or name of the interpreter, or null where none has both packages. */
export function findPython(candidates: readonly string[] = CANDIDATES): string | null {
	const found = candidates.find((program) => {
		const tried = spawnSync(program, ['-c', 'import astropy, scipy'], { stdio: 'ignore' });
		return tried.status === 0;
	});
	return found ?? null;
}
