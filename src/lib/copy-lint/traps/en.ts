/**
 * English traps. Where a comment names no source, the rule is common practice of the copy desk.
 *
 * Units: A. Thompson and B. N. Taylor, Guide for the Use of the International System of Units, NIST Special Publication
 * 811, 2008. Plain reading and looking: W3C, Web Content Accessibility Guidelines 2.2, 2023. Ratios: S. Cohen, Numbers in
 * the Newsroom, Investigative Reporters and Editors, 2001 (from memory). Causes and certainty: Science Literacy Project,
 * Fact-checking essentials (mark “always”, “exactly” and whatever can be verified).
 */
import { trapsFor, type Trap } from './trap.ts';

const trap = trapsFor(
	'(?:a |one )?(?:half|hundred|thousand|million|billion|trillion)s?|one|two|three|four|five|six|seven|eight|nine|ten|eleven|twelve|twenty|thirty|forty|fifty|many|several'
);

const COLOURS = '(?:red|blue|green|yellow|orange|purple|violet|pink|grey|gray|black|brown)';
const DRAWN =
	'(?:line|curve|bar|bars|dot|dots|band|area|part|region|marker|slice|arrow|box|stripe)';
const MASS = '(?:kg|kilograms?|kilogrammes?|kilos?|grams?|grammes?|tonnes?|tons?|solar masses)';
const POWER = '(?:[kMG]?W|(?:kilo|mega|giga)?watts?|amp(?:ere)?s?|horsepower)';

export const ENGLISH: readonly Trap[] = [
	trap(
		'causal-verb',
		'prove proves proved proving proof',
		'prov(?:es?|ed|ing)(?: that)?|proof (?:that|of)',
		'A calculation doesn’t prove; it agrees or disagrees.',
		{ mend: 'Say “shows”, “agrees with” or “fits”, or name the test.' }
	),
	trap(
		'causal-verb',
		'cause causes caused causing',
		'caus(?:es|ed(?: by)?|ing)|cause (?:the|a|an|this|these|its|our)',
		'This sentence states a cause, and its number is a reading, not a cause.',
		{ mend: 'Say what goes with what, or name the study that shows the cause.', wantsReading: true }
	),
	trap(
		'causal-verb',
		'responsible leads',
		'responsible for|leads? to',
		'This sentence states a cause, and its number is a reading, not a cause.',
		{ mend: 'Say what goes with what, or name the study that shows the cause.', wantsReading: true }
	),
	// NIST SP 811, 8.3: weight is a force; what is given in kilograms is a mass.
	trap(
		'weighs-mass',
		'weigh weighs weighed weighing weight',
		`weigh(?:s|ed|ing)?~#\\s*${MASS}|weight of~#\\s*${MASS}`,
		'Kilograms give a mass. Weight is a force, and changes from place to place.',
		{ mend: 'Say “has a mass of”, or give the weight in newtons.' }
	),
	// NIST SP 811, B.8 and SI Brochure 2.3.1: the unit is the kelvin, without “degree” since 1967.
	trap(
		'degrees-kelvin',
		'degree degrees',
		'degrees? kelvins?',
		'The kelvin has had no degrees since 1967.',
		{ replacement: () => 'kelvins' }
	),
	trap(
		'rate-of-power',
		'kw mw gw w kilowatt kilowatts megawatt megawatts gigawatt gigawatts watt watts amp amps ampere amperes horsepower',
		`${POWER} (?:per|an?|each|every) (?:hour|second|minute|day|month|year)|[kMG]W/h`,
		'Power is a rate already: a watt is a joule each second.',
		{ mend: 'For energy say kilowatt-hours; for power leave out the time.' }
	),
	trap(
		'knots-per-hour',
		'knot knots',
		'knots? (?:per|an) hour',
		'A knot is a mile an hour at sea already.',
		{
			replacement: () => 'knots'
		}
	),
	trap(
		'light-year-time',
		'light lightyear lightyears',
		'light[-\\s]?years? (?:ago|later|earlier|old|from now)',
		'A light year is a distance, not a time.',
		{ mend: 'Say “years ago”, or “light years away”.' }
	),
	trap(
		'light-year-time',
		'take takes took taking for in',
		'(?:tak(?:es?|ing)|took|for|in)~# light[-\\s]years?(?! (?:away|across|wide|long|of))',
		'A light year is a distance, not a time.',
		{ mend: 'Say how many years it takes, or how many light years it is away.' }
	),
	trap(
		'times-faster',
		'times',
		'times (?:faster|bigger|larger|greater|higher|hotter|heavier|brighter|longer|farther|further|more|stronger|denser|older|wider|taller|deeper) than',
		'“Three times faster” is three times as fast to some readers, four times to others.',
		{ mend: 'Say “three times as fast as”.' }
	),
	trap(
		'times-less',
		'times',
		'times (?:smaller|less|fewer|slower|lower|weaker|shorter|lighter|fainter|dimmer|colder|cooler|cheaper|thinner|closer|younger|rarer)',
		'Something can’t be ten times smaller than itself: one time smaller leaves nothing.',
		{ mend: 'Say “a tenth of”, “a tenth as much as”.' }
	),
	trap(
		'centrifugal',
		'centrifugal',
		'centrifugal forces?',
		'Seen from outside nothing pushes outward: things go straight on, and a force inward bends their path.',
		{ mend: 'Say what pulls or pushes inward, or say that you turn with it.' }
	),
	trap(
		'only-a-theory',
		'only just merely mere my our',
		'(?:only|just|merely) a theory|mere theory|(?:my|our) theory',
		'A theory is an explanation that has stood tests; a guess is a hypothesis.',
		{ mend: 'Say “idea”, “guess” or “hypothesis”.' }
	),
	trap(
		'exponentially',
		'exponentially',
		'exponentially',
		'Exponential growth doubles in equal times; few things do.',
		{ mend: 'Say how much and how fast, or give the doubling time.' }
	),
	trap(
		'quantum-leap',
		'quantum',
		'quantum (?:leap|jump)s?',
		'A quantum leap is the smallest there is.',
		{
			mend: 'Say “a large step”, and how large.'
		}
	),
	trap(
		'warm-temperature',
		'hot hotter hottest warm warmer warmest cold colder coldest cool cooler',
		'(?:hot|warm|cold|cool)(?:t?er|t?est)? temperatures?',
		'Things are hot; temperatures are high.',
		{ mend: 'Say “high” or “low”.' }
	),
	trap(
		'zero-gravity',
		'zero no without absence',
		'(?:zero|no|without|absence of)[-\\s]gravity(?: in space| in orbit)?',
		'Gravity reaches out there too: in a low orbit it is nearly as strong as on the ground.',
		{ mend: 'Say “weightless” or “in free fall”.' }
	),
	trap(
		'dark-side',
		'dark',
		'dark side of the moon',
		'The far side of the Moon has as much day as the near side.',
		{
			replacement: () => 'far side of the Moon'
		}
	),
	trap(
		'sucked-in',
		'suck sucks sucked sucking',
		'suck(?:s|ed|ing)? (?:in(?:to)?|up|everything|out|down)',
		'Neither a vacuum nor a black hole sucks: pressure pushes, gravity pulls.',
		{ mend: 'Say “falls in”, “is pushed in” or “is pulled”.' }
	),
	trap(
		'up-to-or-more',
		'up',
		'up to~ (?:or (?:even )?(?:more|higher|longer|further)|and (?:beyond|above|more))',
		'“Up to … or more” says nothing: it names every number.',
		{ mend: 'Give the range, or the most that was seen.' }
	),
	trap(
		'one-in-more',
		'1 one',
		'(?:1|one) in # (?:times )?(?:more|less|fewer|higher|lower|as)',
		'A share and a comparison are run together here.',
		{ mend: 'Give both shares: “two in ten, against one in ten before”.' }
	),
	trap(
		'passive-known',
		'it',
		'it (?:is|was|has been)(?: (?:well|widely|generally|commonly|often|now))? (?:known|believed|thought|said|assumed|accepted|understood|argued|estimated) that',
		'Who knows it?',
		{ mend: 'Say who found it and how, or just state it with its source.' }
	),
	trap(
		'passive-known',
		'scientists researchers experts studies research science',
		'(?:scientists|researchers|experts) (?:say|believe|think|agree|know|claim)|(?:studies|research|science) (?:shows?|says?|suggests?|proves?)',
		'Which ones?',
		{ mend: 'Name the people or the study, with its year.' }
	),
	trap(
		'goes-stale',
		'recent recently currently nowadays lately presently last next newest latest new',
		'recent(?:ly)?(?! years as)|currently|nowadays|lately|presently|(?:last|next) (?:year|month|week|decade|summer|winter)|(?:newest|latest|new) (?:study|studies|results?|data|findings?|measurements?|research)',
		'A reader may meet this in five years.',
		{ mend: 'Give the year.' }
	),
	// Poynter and others on firsts: the desk asks who counted.
	trap(
		'superlative',
		'the world',
		'the (?:very )?(?:first|only|largest|biggest|smallest|fastest|oldest|farthest|most [\\p{L}]+|[\\p{L}]+est)(?: [\\p{L}]+){0,3} (?:ever|of all time|in (?:the (?:world|universe|history)|history)|on earth|known|to date|so far)|world record',
		'A superlative needs a source that looked at all the others.',
		{ mend: 'Name who counted and when, or say “among the largest”.' }
	),
	trap(
		'superlative',
		'unprecedented unique record',
		'unprecedented|(?:very |quite )?unique|record[-\\s]breaking',
		'A superlative needs a source that looked at all the others.',
		{ mend: 'Name who counted and when, or say what is unusual.' }
	),
	// WCAG 2.2, 2.4.4 Link Purpose (In Context).
	trap(
		'click-here',
		'click tap read follow more',
		'(?:click|tap) (?:here|this|on this)|(?:read|find out|learn) more here|follow this link|more here',
		'Heard alone, this link doesn’t say where it goes.',
		{ mend: 'Make the name of the page the link.' }
	),
	// WCAG 2.2, 1.3.3 Sensory Characteristics; on a phone everything stands in one column.
	trap(
		'see-left',
		'see pictured shown on to at left right',
		`(?:see|pictured|shown)(?: on| at)?(?: the)? (?:left|right)|(?:on|to|at) the (?:left|right)[-\\s]hand side|(?:left|right)[-\\s]hand (?:chart|graph|picture|image|panel|figure|diagram)`,
		'On a phone there is no left or right: all stands in one column.',
		{ mend: 'Name the chart or the picture.' }
	),
	trap(
		'see-left',
		'chart graph picture image photo figure diagram table',
		'(?:chart|graph|picture|image|photo|figure|diagram|table) (?:on|to|at) the (?:left|right)',
		'On a phone there is no left or right: all stands in one column.',
		{ mend: 'Name the chart or the picture.' }
	),
	// WCAG 2.2, 1.4.1 Use of Color.
	trap(
		'colour-only',
		'red blue green yellow orange purple violet pink grey gray black brown',
		`${COLOURS} ${DRAWN}`,
		'Not everyone sees this colour.',
		{ mend: 'Add its name or its shape: “the dashed line for dust”.' }
	),
	trap(
		'colour-only',
		'in marked shown',
		`(?:marked|shown|drawn|highlighted) in ${COLOURS}`,
		'Not everyone sees this colour.',
		{ mend: 'Add its name or its shape.' }
	)
];
