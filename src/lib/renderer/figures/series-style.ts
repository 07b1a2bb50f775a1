/** How series are told apart without colour: by the line's dashes, by the shape of its marks, by a letter. */

export interface SeriesStyle {
	/** `stroke-dasharray` in pixels; '' for a whole line. */
	dash: string;
	/** The mark, about the origin, 8 px wide. */
	mark: string;
	letter: string;
	className: string;
}

const STYLES: readonly SeriesStyle[] = [
	{
		dash: '',
		mark: 'M-4 0A4 4 0 1 1 4 0A4 4 0 1 1-4 0Z',
		letter: 'A',
		className: 'sy-series-1'
	},
	{ dash: '10 5', mark: 'M-3.6-3.6H3.6V3.6H-3.6Z', letter: 'B', className: 'sy-series-2' },
	{ dash: '2 4', mark: 'M0-4.6L4.6 3.4H-4.6Z', letter: 'C', className: 'sy-series-3' },
	{ dash: '9 4 2 4', mark: 'M0-5L5 0L0 5L-5 0Z', letter: 'D', className: 'sy-series-4' }
];

export function seriesStyle(index: number): SeriesStyle {
	return STYLES[index % STYLES.length]!;
}
