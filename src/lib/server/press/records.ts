/** How each number of a release is known, told for readers: the weighing, the people, the sources, the working. */
import { beamPicture } from '../../factcheck/beam.ts';
import { weighingOf } from '../../factcheck/claim-weighing.ts';
import { judgeClaims } from '../../factcheck/judge.ts';
import { readsOnBeam, verdictSentence } from '../../factcheck/words.ts';
import type { CalculatorSet, Source } from '../../physics/calculator.ts';
import { cosmologySets } from '../../physics/constants/cosmologies.ts';
import { lineById } from '../../physics/lines/catalogue.ts';
import type { ClaimRecord, ClaimRecords } from '../../renderer/records.ts';
import type { Claim, SettingSource, WidgetDocument } from '../../widget/document.ts';
import { benchSet } from '../../widget/bench-set.ts';
import { evaluate } from '../../widget/evaluate.ts';
import { wiringOf } from '../../widget/graph.ts';
import { claimPlaces, wordsAt } from '../../widget/places.ts';

/** One signature in force. */
export interface Signing {
	claim: string;
	/** The signer's name. */
	name: string;
	signedAt: Date;
}

type WeighedClaim = Exclude<Claim, { form: 'exempt' }>;

/** A record for every claim in the copy that is one; what the writer exempted has none. */
export function recordsOf(
	document: WidgetDocument,
	house: CalculatorSet,
	signings: readonly Signing[]
): ClaimRecords {
	const calculators = benchSet(document, house);
	const evaluation = evaluate(document, {}, calculators);
	const verdicts = judgeClaims(document, calculators);
	const places = claimPlaces(document, wordsAt(document, evaluation, calculators));

	const records = places.flatMap(({ claim, words }): [string, ClaimRecord][] => {
		const verdict = verdicts.get(claim.id);
		if (claim.form === 'exempt' || !verdict) return [];
		const weighing = weighingOf(document, evaluation, claim, words, calculators);
		const picture = weighing && beamPicture(weighing.stated, weighing.reading);
		return [
			[
				claim.id,
				{
					beam:
						weighing && picture
							? {
									picture,
									words,
									reads: readsOnBeam(weighing.stated, weighing.reading, document.language)
								}
							: null,
					says: weighing
						? verdictSentence(
								weighing.stated,
								weighing.reading,
								verdict,
								'reader',
								words,
								document.language
							)
						: verdict.reason,
					checkedBy: checkersOf(claim.id, signings),
					...groundsOf(document, claim, calculators)
				}
			]
		];
	});
	return Object.fromEntries(records);
}

function checkersOf(claimId: string, signings: readonly Signing[]): ClaimRecord['checkedBy'] {
	return signings
		.filter(({ claim }) => claim === claimId)
		.sort((a, b) => b.signedAt.getTime() - a.signedAt.getTime())
		.map(({ name, signedAt }) => ({ name, on: signedAt.toISOString() }));
}

/** The first source of a calculator is that of its method; all of them stand on its own page. */
function groundsOf(
	document: WidgetDocument,
	{ reading }: WeighedClaim,
	calculators: CalculatorSet
): Pick<ClaimRecord, 'restsOn' | 'working'> {
	if ('setting' in reading) return { restsOn: settingGrounds(document, reading), working: [] };
	const steps = wiringOf(document.steps, reading).steps;
	const used = steps.flatMap(({ calculator }) => calculators.get(calculator) ?? []);
	const given = steps.flatMap(({ settings }) => Object.values(settings)).flatMap(valueSource);
	const methods = used.flatMap(({ sources }) => sources.slice(0, 1).map(sourceWords));
	return {
		restsOn: [...new Set([...given, ...methods])],
		working: [
			...new Set(used.flatMap(({ equations }) => equations.slice(0, 1).map(({ says }) => says)))
		]
	};
}

/** Where a setting's value was published: a line, or a set of parameters. */
function valueSource(setting: SettingSource): string[] {
	if (setting.from === 'line') {
		const line = lineById(setting.line);
		return line ? [`${line.label}: ${line.source}`] : [];
	}
	const set =
		setting.from === 'fixed' && typeof setting.value === 'object' ? setting.value.set : undefined;
	return typeof set === 'string' && isSetName(set) ? [cosmologySets[set].source] : [];
}

function isSetName(name: string): name is keyof typeof cosmologySets {
	return Object.hasOwn(cosmologySets, name);
}

/** A setting rests on where it came from, not on the calculator that takes it. */
function settingGrounds(
	document: WidgetDocument,
	ref: { step: string; setting: string }
): string[] {
	const setting = document.steps.find(({ id }) => id === ref.step)?.settings[ref.setting];
	if (!setting) return [];
	return setting.from === 'line' ? valueSource(setting) : ['the writer’s choice'];
}

function sourceWords({ title, locator }: Source): string {
	return [title, locator].filter(Boolean).join(', ');
}
