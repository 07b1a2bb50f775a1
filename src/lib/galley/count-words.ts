const NUMBERS = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight', 'Nine'];

/** “Two faults”. */
export function faultCount(count: number): string {
	return `${NUMBERS[count] ?? count} ${count === 1 ? 'fault' : 'faults'}`;
}
