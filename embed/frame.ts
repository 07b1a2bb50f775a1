/**
 * Wakes a published frame: reads the release in its document, loads the calculators it uses, and takes over the markup
 * that the server drew. It keeps nothing, asks for nothing, and tells the page around it only its height.
 */
import './document.css';
import { hydrate } from 'svelte';
import type { Calculator, CalculatorSet } from '../src/lib/physics/calculator.ts';
import type { HouseDefinition } from '../src/lib/physics/house/definition.ts';
import { loadBlockViews } from '../src/lib/renderer/blocks/block-views.ts';
import { loadChartViews } from '../src/lib/renderer/blocks/chart-views.ts';
import Frame from '../src/lib/renderer/Frame.svelte';
import { loadReaderWords } from '../src/lib/renderer/reader-words.ts';
import type { FrameRelease } from '../src/lib/renderer/release.ts';
import { loadPrintWords } from '../src/lib/widget/languages/load.ts';
import { heightMessage } from './messages.ts';

/** The release in the document, and where the script of each of its calculators is. */
interface Inlined {
	release: FrameRelease;
	calculators: Record<string, string>;
}

async function wake(target: HTMLElement, { release, calculators }: Inlined): Promise<void> {
	const [loaded] = await Promise.all([
		Promise.all(Object.entries(calculators).map(([id, address]) => loadCalculator(id, address))),
		loadChartViews(release.document),
		loadBlockViews(release.document),
		loadReaderWords(release.document.language),
		loadPrintWords(release.document.language)
	]);
	// A release from before the house had calculators of its own carries none.
	const own = await buildAll(release.houseCalculators ?? []);
	hydrate(Frame, {
		target,
		props: { release, calculators: new Map([...loaded, ...own]) satisfies CalculatorSet }
	});
	document.documentElement.dataset.awake = '';
	tellHeight();
}

async function loadCalculator(id: string, address: string): Promise<[string, Calculator]> {
	const module: Record<string, Calculator> = await import(/* @vite-ignore */ address);
	const calculator = Object.values(module).find((exported) => exported.id === id);
	if (!calculator) throw new Error(`${address} has no calculator ${id}`);
	return [id, calculator];
}

/** What builds them is loaded only by frames that have some. */
async function buildAll(definitions: readonly HouseDefinition[]): Promise<[string, Calculator][]> {
	if (definitions.length === 0) return [];
	const { buildHouseCalculator } = await import('../src/lib/physics/house/build.ts');
	return definitions.map((definition) => [definition.id, buildHouseCalculator(definition)]);
}

function tellHeight(): void {
	if (window.parent === window) return;
	let told = 0;
	const tell = () => {
		const height = Math.ceil(document.body.getBoundingClientRect().height);
		if (height === told) return;
		told = height;
		window.parent.postMessage(heightMessage(height), '*');
	};
	new ResizeObserver(tell).observe(document.body);
	tell();
}

const target = document.getElementById('frame');
const inlined = document.getElementById('release')?.textContent;
if (target && inlined) await wake(target, JSON.parse(inlined));
