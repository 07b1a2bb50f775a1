import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';

/** WCAG 2.0 to 2.2, A and AA, and the practices axe calls best, on the page and all frames in it. */
const TAGS = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

/** Fails with one line a finding: the rule, what it asks for, and where. */
export async function expectNoAxeFindings(page: Page): Promise<void> {
	const { violations } = await new AxeBuilder({ page }).withTags(TAGS).analyze();
	const findings = violations.flatMap(({ id, help, nodes }) =>
		nodes.map(
			({ target, failureSummary }) =>
				`${id}: ${help} at ${target.join(' ')}\n${failureSummary ?? ''}`
		)
	);
	expect(findings, `axe on ${page.url()}`).toEqual([]);
}
