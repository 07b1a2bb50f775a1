/** Which controls measure and which offer options. Apart from their schema, since a reader's frame needs only this. */
import type { Control, MeasuredControl, OptionControl } from './control.ts';

export function hasOptions(control: Control): control is OptionControl {
	return control.kind === 'choice' || control.kind === 'toggle';
}

export function isMeasured(control: Control): control is MeasuredControl {
	return !hasOptions(control);
}
