/** What charts say in English. */
export const en = {
	table: 'The chart in words and as a table',
	tableRegion: (title: string) => `Table of the chart: ${title}`,
	item: 'Name',
	part: 'Part',
	total: 'together',
	uncertainty: 'standard uncertainty',
	source: 'Source',
	now: 'As set now',
	noReading: 'no reading',
	nothing: 'There is nothing to draw at these settings.',

	bothEven: 'both scales even',
	bothLog: 'both scales log',
	upLog: 'upright scale log, level scale even',
	levelLog: 'upright scale even, level scale log',
	logScale: (step: string) => `log scale: ${step}`,
	step: (factor: string) => `each step is ${factor} times`,
	unevenStep: 'equal distances are equal factors',
	factors: { 10: 'ten', 100: 'a hundred', 1000: 'a thousand' } as Record<number, string>,
	cut: (start: string) => `axis starts at ${start}`,
	power: (amount: string) => `1 on the axis is ${amount}`,
	powers: { 3: 'a thousand', 6: 'a million', 9: 'a billion', 12: 'a trillion' } as Record<
		number,
		string
	>,
	base: (start: string) => `counted from ${start}`,
	at: (value: string) => `at ${value}`,
	fromTo: (low: string, high: string) => `from ${low} to ${high}`,

	band: (whole: string) => `Hatched: ${whole}.`,
	whisker: 'A whisker is one standard uncertainty to either side.',
	gap: (range: string, label: string, message: string) =>
		`No reading${label && ` of ${label}`} ${range}: ${message}`,
	refused: (label: string, message: string) => `${label}: no reading. ${message}`,
	notAboveZero: (label: string) =>
		`${label} isn’t above 0 and has no place on a log scale; the table has its number.`,
	partlyNotAboveZero: (label: string) =>
		`Where ${label} isn’t above 0 it has no place on a log scale; the table has its numbers.`,
	tooShort: (label: string) => `${label}: its bar is too short to be seen at this scale.`,
	tooThin: (label: string) => `${label}: its part is too thin to be seen at this scale.`,
	tooSmall: (label: string) =>
		`${label} is too small to be seen well at this scale: look inside the ring.`,
	noShape: (label: string) => `${label} is below 0, and no shape has such a size.`,
	byArea: 'Drawn by area: twice the number is twice the area.',
	byWidth: 'Drawn by width: twice the number is twice as wide. Compare widths, not areas.',
	negativePart: (label: string) =>
		`${label} is below 0, and what is stacked must add up from 0: this column isn’t drawn.`,
	partRefused: (label: string, message: string) =>
		`${label}: no reading, so this column has no total. ${message}`,
	rounded: (sum: string, total: string) =>
		`The rounded parts add up to ${sum}, the total to ${total}: each is rounded by itself.`,
	visible: (range: string) => `Hatched: visible light, wavelengths ${range} nanometres.`,
	emitted: 'Dashed lines are as emitted, solid ones as observed.'
};
