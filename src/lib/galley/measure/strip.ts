/** Measures a strip at its first settings and at every control's ends, and leaves it as it was. */
import type { LiveWidget } from '$lib/renderer/live-widget.svelte.ts';
import { settingAt, stepsOf } from '$lib/widget/control-grid.ts';
import { hasOptions, type Control } from '$lib/widget/control.ts';
import type { ControlValues } from '$lib/widget/document.ts';
import { tick } from 'svelte';
import type { StripFault, StripReport } from '../report.ts';
import type { StripKind } from '../strips.ts';
import { axeFaults } from './axe.ts';
import { Parts, quote } from './parts.ts';
import { firstView, FIRST_VIEW, headings, targets, wordsForPictures } from './structure.ts';
import { textFit } from './text-fit.ts';

/** Heights that differ by less are the same, in CSS pixels. */
const SLACK = 1;

/** The first settings, then each control alone at its ends, or at each of its options. */
function standsOf(widget: LiveWidget): ControlValues[] {
	const ends = (control: Control): number[] =>
		hasOptions(control)
			? control.options.map((_, index) => index)
			: [settingAt(control, 0), settingAt(control, stepsOf(control))];
	return [
		{},
		...widget.document.controls.flatMap((control) =>
			ends(control)
				.filter((value) => value !== control.initial)
				.map((value) => ({ [control.id]: value }))
		)
	];
}

export function frameHeight(document: Document): number {
	return Math.ceil(document.body.getBoundingClientRect().height);
}

export async function measureStrip(
	root: HTMLElement,
	widget: LiveWidget,
	kind: StripKind
): Promise<StripReport> {
	const parts = new Parts(root, widget.document);
	const first: Omit<StripFault, 'setting'>[] = [];
	const faults: StripFault[] = [];
	const seen = new Set<string>();
	const add = (fault: StripFault) => {
		const key = [fault.measure, fault.block, fault.subject].join('\n');
		if (seen.has(key)) return;
		seen.add(key);
		faults.push(fault);
	};

	let firstHeights = new Map<Element, number>();
	const report: StripReport = { heightPx: 0, tallestPx: 0, tallestAt: '', faults };
	for (const values of standsOf(widget)) {
		widget.setAll(values);
		await tick();
		const [moved] = Object.keys(values);
		const control = moved === undefined ? undefined : widget.control(moved);
		const setting = control ? quote(`${control.label}: ${widget.printSetting(control.id)}`) : '';
		const heightPx = frameHeight(root.ownerDocument);
		const heights = new Map(
			[...parts.blocks.keys()].map((part) => [part, part.getBoundingClientRect().height])
		);
		for (const found of textFit(root, parts)) add({ ...found, setting, says: '' });
		if (setting === '') {
			firstHeights = heights;
			report.heightPx = heightPx;
			const still = [
				...targets(root, parts),
				...headings(root, parts),
				...wordsForPictures(root, parts),
				...(kind.widthPx === FIRST_VIEW.widthPx && kind.look === 'light'
					? firstView(root, parts)
					: [])
			];
			first.push(...still.map((found) => ({ ...found, says: '' })));
			if (kind.axe !== 'none') first.push(...(await axeFaults(root, parts, kind.axe)));
			for (const found of first) add({ ...found, setting: '' });
		} else if (kind.look !== 'print') {
			for (const jump of jumps(parts, firstHeights, heights)) add({ ...jump, setting, says: '' });
		}
		if (heightPx > report.tallestPx) {
			report.tallestPx = heightPx;
			report.tallestAt = setting;
		}
		// Other work of the page goes in between.
		await new Promise((resolve) => setTimeout(resolve));
	}
	return report;
}

function jumps(
	parts: Parts,
	before: ReadonlyMap<Element, number>,
	after: ReadonlyMap<Element, number>
): Omit<StripFault, 'setting' | 'says'>[] {
	return [...parts.blocks].flatMap(([part, block]) => {
		const by = (after.get(part) ?? 0) - (before.get(part) ?? 0);
		if (Math.abs(by) <= SLACK) return [];
		const { left, top } = part.getBoundingClientRect();
		const subject = part.matches('.sy-result')
			? 'result'
			: part.matches('.sy-chart')
				? 'chart'
				: 'part';
		return [
			{ measure: 'jump' as const, block, subject, byPx: Math.round(by), spot: { x: left, y: top } }
		];
	});
}
