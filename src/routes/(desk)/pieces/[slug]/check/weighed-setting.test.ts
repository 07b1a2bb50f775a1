import { judgeClaims } from '$lib/factcheck/judge.ts';
import { catalogue } from '$lib/physics/calculators/index.ts';
import { firstLight } from '$lib/server/demo/first-light.ts';
import type { WidgetDocument } from '$lib/widget/document.ts';
import { describe, expect, test } from 'vitest';
import { claimRecord } from './claim-record.ts';
import { verdictPicture } from './verdict-picture.ts';
import { weighedSetting } from './weighed-setting.ts';

/** “About 21 times”, said beside a number that moves: it fits where the slider starts and nowhere near its ends. */
function movingStretch(): WidgetDocument {
	const moved = structuredClone(firstLight);
	moved.blocks = moved.blocks.map((block) =>
		block.kind === 'paragraph' ? { ...block, kind: 'result' } : block
	);
	return moved;
}

function seen(document: WidgetDocument, id: string, words: string) {
	const claim = document.claims.find((each) => each.id === id)!;
	const verdict = judgeClaims(document, catalogue).get(id)!;
	const setting = weighedSetting(document, claim, { words, verdict }, catalogue);
	return { claim, verdict, setting, view: { words, verdict } };
}

describe('what stands behind a verdict is read at the setting the verdict comes from', () => {
	test('level from the start: there', () => {
		const { setting } = seen(firstLight, 'stretch', 'about 21 times');
		expect(setting).toEqual({ values: {}, words: null });
	});

	test('worst at another setting: at that one, in the beam, the reading and the words', () => {
		const document = movingStretch();
		const { claim, verdict, setting, view } = seen(document, 'stretch', 'about 21 times');
		expect(verdict.verdict).toBe('tips');
		expect(verdict.reason).toContain(setting.words);
		expect(Object.keys(setting.values)).toHaveLength(1);

		const picture = verdictPicture(document, claim, view, setting, catalogue);
		expect(picture?.beam?.departurePercent).toBeCloseTo(verdict.departurePercent!, 6);
		const record = claimRecord(document, claim, view.words, catalogue, setting.values);
		const start = claimRecord(document, claim, view.words, catalogue);
		expect(record?.reading?.value).not.toBe(start?.reading?.value);
		expect(record?.working[0]?.settings.map(({ origin }) => origin).join()).toContain(
			'here at this setting'
		);
	});
});
