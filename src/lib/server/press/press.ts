/** Prints a release: the frame drawn with the reader's own components, and every file it will ever ask for. */
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { render } from 'svelte/server';
import type { Calculator, CalculatorSet } from '../../physics/calculator.ts';
import type { HouseDefinition } from '../../physics/house/definition.ts';
import { mathKey, type SetMath } from '../../renderer/math-node.ts';
import type { ClaimRecords } from '../../renderer/records.ts';
import Frame from '../../renderer/Frame.svelte';
import type { FrameRelease } from '../../renderer/release.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { benchSet } from '../../widget/bench-set.ts';
import { sampleChart, type ChartPoint } from '../../widget/evaluate.ts';
import { formulaDefinition } from '../../widget/formula-definition.ts';
import { canonicalJson, type Frozen } from '../../widget/freeze.ts';
import { policyHash, sha256 } from '../auth/hashes.ts';
import { mathTree } from '../../typeset/math-tree.ts';
import type { Makers } from './account.ts';
import type { Bundle, BundleFile, BundleManifest } from './bundle.ts';
import { readManifest, type PressManifest } from './manifest.ts';
import { framePage } from './page.ts';

export type { Bundle, BundleFile, BundleManifest } from './bundle.ts';

export interface BundleInput {
	frozen: Frozen;
	/** All that the house works with. */
	calculators: CalculatorSet;
	/** The house's own among them, as data; the frame carries those the piece uses, and the piece's formulas. */
	houseCalculators: readonly HouseDefinition[];
	slug: string;
	releaseNumber: number;
	releasedAt: Date;
	/** The house's name. */
	house: string;
	makers: Makers;
	records: ClaimRecords;
	/** The files of its pictures, under `press/`. */
	pictures?: BundleFile[];
	/** Where the piece's public page is, when it isn't the frame's own host. */
	origin?: string;
	/** The folder of the frame's build; `build/press` in a checkout. */
	pressFolder: string;
}

/**
 * Throws when the frame hasn't been built, or when a calculator of the piece isn't in that build. The same input and
 * build give the same bytes.
 */
export async function makeBundle(input: BundleInput): Promise<Bundle> {
	const { frozen, slug, pressFolder } = input;
	const press = await readManifest(pressFolder);
	const bench = benchSet(frozen.document, input.calculators);
	const used = frozen.calculators.map(({ id }) => calculatorOf(id, bench));
	const ids = new Set(used.map(({ id }) => id));
	const houseCalculators = [
		...input.houseCalculators,
		// The frame carries no more of a formula than it works with.
		...frozen.document.formulas.map((formula) => ({ ...formulaDefinition(formula), checks: [] }))
	].filter(({ id }) => ids.has(id));
	const ownIds = new Set(houseCalculators.map(({ id }) => id));
	const builtIn = used.filter(({ id }) => !ownIds.has(id));
	const scripts = builtIn.map((calculator) => scriptOf(press, calculator));
	const css = await readFile(join(pressFolder, press.style), 'utf8');

	const release: FrameRelease = {
		slug,
		number: input.releaseNumber,
		releasedAt: input.releasedAt.toISOString(),
		house: input.house,
		origin: input.origin ?? '',
		document: frozen.document,
		digest: frozen.digest,
		records: input.records,
		curves: curvesOf(frozen.document, bench),
		math: mathOf(frozen.document, bench),
		houseCalculators
	};
	const calculators = new Map(used.map((calculator) => [calculator.id, calculator]));
	const address = (name: string) => `/press/${name}`;
	const html = framePage({
		release,
		body: render(Frame, { props: { release, calculators } }).body,
		css,
		script: address(press.frame.file),
		ahead: namesOf([{ file: '', imports: press.frame.imports }, ...scripts]).map(address),
		copyFace: address(press.copyFace),
		calculators: Object.fromEntries(
			builtIn.map(({ id }, index) => [id, address(scripts[index]?.file ?? '')])
		)
	});

	const page = contentFile('frames', 'html', 'text/html; charset=utf-8', html);
	const record = contentFile(
		'releases',
		'json',
		'application/json; charset=utf-8',
		canonicalJson({ version: 1, release, frozen, makers: input.makers })
	);
	const assets = namesOf([
		press.frame,
		...scripts,
		{ file: '', imports: [...press.later, ...press.fonts] }
	]);
	const files = [
		page,
		record,
		...(await Promise.all(assets.map((name) => pressFile(pressFolder, name)))),
		...(input.pictures ?? [])
	];
	return { digest: page.sha256, files, manifest: manifestOf(release, page, css, files) };
}

/** The equations that the piece shows, each once. */
function mathOf(document: WidgetDocument, calculators: CalculatorSet): FrameRelease['math'] {
	const book: Record<string, SetMath> = {};
	for (const block of document.blocks) {
		if (block.kind !== 'equation') continue;
		const step = document.steps.find(({ id }) => id === block.step);
		const calculator = step && calculators.get(step.calculator);
		const equation = calculator?.equations[block.equation];
		const tree = equation && mathTree(equation.tex);
		if (tree)
			book[mathKey(calculator.id, calculator.revision, block.equation)] = {
				tree,
				says: equation.says
			};
	}
	return book;
}

/** Figures kept of a drawn line: a thousandth of a pixel in any frame. */
const CURVE_FIGURES = 7;

function curvesOf(document: WidgetDocument, calculators: CalculatorSet): FrameRelease['curves'] {
	const charts = document.blocks.filter((block) => block.kind === 'chart' && block.form === 'line');
	const rounded = ({ y }: ChartPoint) => (y === null ? null : Number(y.toPrecision(CURVE_FIGURES)));
	return Object.fromEntries(
		charts.map((chart) => [
			chart.id,
			sampleChart(document, {}, chart, calculators).map((line) => line.map(rounded))
		])
	);
}

function manifestOf(
	release: FrameRelease,
	page: BundleFile,
	css: string,
	files: BundleFile[]
): BundleManifest {
	return {
		version: 1,
		slug: release.slug,
		release: release.number,
		releasedAt: release.releasedAt,
		digest: page.sha256,
		page: page.key,
		styles: [policyHash(css)],
		files: files.map(({ key, contentType, sha256 }) => ({ key, contentType, sha256 }))
	};
}

function calculatorOf(id: string, calculators: CalculatorSet): Calculator {
	const calculator = calculators.get(id);
	if (!calculator) throw new Error(`The house has no calculator ${id}.`);
	return calculator;
}

function scriptOf(press: PressManifest, { id }: Calculator): PressManifest['frame'] {
	const script = press.calculators[id];
	if (!script)
		throw new Error(`The frame’s build has no calculator ${id}. Build again: npm run build`);
	return script;
}

/** File names, each once, in order of first mention. */
function namesOf(scripts: PressManifest['frame'][]): string[] {
	return [...new Set(scripts.flatMap(({ file, imports }) => [file, ...imports]))].filter(Boolean);
}

const TYPES: Record<string, string> = {
	js: 'text/javascript; charset=utf-8',
	woff2: 'font/woff2'
};

async function pressFile(pressFolder: string, name: string): Promise<BundleFile> {
	const contentType = TYPES[name.split('.').at(-1) ?? ''];
	if (!contentType) throw new Error(`The frame’s build has a file of an unknown kind: ${name}`);
	const bytes = await readFile(join(pressFolder, name));
	return { key: `press/${name}`, contentType, bytes, sha256: sha256(bytes) };
}

function contentFile(
	folder: string,
	ending: string,
	contentType: string,
	text: string
): BundleFile {
	const bytes = Buffer.from(text, 'utf8');
	const hash = sha256(bytes);
	return { key: `${folder}/${hash}.${ending}`, contentType, bytes, sha256: hash };
}
