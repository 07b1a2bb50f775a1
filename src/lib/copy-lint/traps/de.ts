/**
 * German traps. Where a comment names no source, the rule is common practice of the copy desk; units follow the BIPM,
 * The International System of Units (SI Brochure), 9th edition, 2019, looking and links W3C, WCAG 2.2, 2023.
 */
import { trapsFor, type Trap } from './trap.ts';

const trap = trapsFor(
	'(?:ein(?:e|er|en)? )?(?:halbe|hundert|tausend|Million(?:en)?|Milliarden?|Billion(?:en)?)|eins?|eine[mnrs]?|zwei|drei|vier|fünf|sechs|sieben|acht|neun|zehn|elf|zwölf|zwanzig|viele|mehrere|etwa|rund'
);

const COLOURS = '(?:rot|blau|grün|gelb|orange|violett|lila|rosa|grau|schwarz|braun)e[nmrs]?';
const DRAWN =
	'(?:Linie|Kurve|Balken|Punkte?|Fläche|Bereich|Band|Teil|Pfeil|Kasten|Streifen|Markierung)';
const MASS = '(?:kg|Kilogramm|Kilo|Gramm|Tonnen?|Sonnenmassen?)';
const COMPARED =
	'(?:schneller|größer|höher|heißer|schwerer|heller|länger|weiter|mehr|stärker|dichter|älter|breiter|tiefer)';
const LESS =
	'(?:kleiner|weniger|langsamer|niedriger|schwächer|kürzer|leichter|kälter|billiger|dünner|näher|jünger|dunkler|seltener)';
const TIMES = '(?<=(?:mal|fach)\\s+)';

export const GERMAN: readonly Trap[] = [
	trap(
		'causal-verb',
		'beweist beweisen bewies bewiesen beweis',
		'beweis(?:t|en)|bewies(?:en)?|Beweis (?:dafür|für)',
		'A calculation doesn’t prove; it agrees or disagrees.',
		{ mend: 'Say “zeigt”, “passt zu”, or name the test.' }
	),
	trap(
		'causal-verb',
		'verursacht verursachen verursachte bewirkt bewirken führt führen',
		'verursach(?:t|en|te)|bewirk(?:t|en)|führ(?:t|en) zu',
		'This sentence states a cause, and its number is a reading, not a cause.',
		{ mend: 'Say what goes with what, or name the study that shows the cause.', wantsReading: true }
	),
	trap(
		'weighs-mass',
		'wiegt wiegen wog wogen gewicht',
		`(?:wieg(?:t|en)|wog(?:en)?)~#\\s*${MASS}|Gewicht von~#\\s*${MASS}`,
		'Kilograms give a mass. Weight is a force, and changes from place to place.',
		{ mend: 'Say “hat eine Masse von”, or give the weight in newtons.' }
	),
	trap('degrees-kelvin', 'grad', 'Grad Kelvin', 'The kelvin has had no degrees since 1967.', {
		replacement: () => 'Kelvin'
	}),
	trap(
		'rate-of-power',
		'kw mw gw w kilowatt megawatt gigawatt watt ampere ps',
		'(?:(?:Kilo|Mega|Giga)?watt|[kMG]?W|Ampere|PS) (?:pro|je|in der) (?:Stunde|Sekunde|Minute|Tag|Monat|Jahr)|[kMG]W/h',
		'Power is a rate already: a watt is a joule each second.',
		{ mend: 'For energy say “Kilowattstunden”; for power leave out the time.' }
	),
	trap(
		'knots-per-hour',
		'knoten',
		'Knoten (?:pro|in der) Stunde',
		'A knot is a mile an hour at sea already.',
		{
			replacement: () => 'Knoten'
		}
	),
	trap(
		'light-year-time',
		'vor dauert dauerte dauern braucht brauchte brauchen nach seit in',
		'(?:vor|nach|seit|in|dauert(?:e|en)?|dauern|brauch(?:t|te|en))~# Lichtjahre?n?(?! (?:Entfernung|entfernt|Abstand|weit))',
		'A light year is a distance, not a time.',
		{ mend: 'Say how many years, or how many light years away.' }
	),
	trap(
		'light-year-time',
		'lichtjahre',
		'Lichtjahre lang',
		'A light year is a distance, not a time.',
		{
			mend: 'Say how many years.'
		}
	),
	trap(
		'times-faster',
		'schneller größer höher heißer schwerer heller länger weiter mehr stärker dichter älter breiter tiefer',
		`${TIMES}${COMPARED}`,
		'“Dreimal schneller” is three times as fast to some readers, four times to others.',
		{ mend: 'Say “dreimal so schnell wie”.' }
	),
	trap(
		'times-less',
		'kleiner weniger langsamer niedriger schwächer kürzer leichter kälter billiger dünner näher jünger dunkler seltener',
		`${TIMES}${LESS}`,
		'Something can’t be ten times smaller than itself: one time smaller leaves nothing.',
		{ mend: 'Say “ein Zehntel so groß wie”.' }
	),
	trap(
		'centrifugal',
		'zentrifugalkraft fliehkraft zentrifugalkräfte fliehkräfte',
		'(?:Zentrifugal|Flieh)kr(?:aft|äfte)',
		'Seen from outside nothing pushes outward: things go straight on, and a force inward bends their path.',
		{ mend: 'Say what pulls or pushes inward, or say that you turn with it.' }
	),
	trap(
		'only-a-theory',
		'nur bloß bloße lediglich meine unsere',
		'(?:nur|bloß|lediglich) eine Theorie|(?:bloße|meine|unsere) Theorie',
		'A theory is an explanation that has stood tests; a guess is a hypothesis.',
		{ mend: 'Say “Vermutung” or “Hypothese”.' }
	),
	trap(
		'exponentially',
		'exponentiell exponentielle',
		'exponentielle?',
		'Exponential growth doubles in equal times; few things do.',
		{ mend: 'Say how much and how fast, or give the doubling time.' }
	),
	trap(
		'quantum-leap',
		'quantensprung quantensprünge quantensprungs',
		'Quantenspr(?:ung(?:s|es)?|ünge)',
		'A quantum leap is the smallest there is.',
		{ mend: 'Say “ein großer Schritt”, and how large.' }
	),
	trap(
		'warm-temperature',
		'heiße heißere heißen warme wärmere warmen kalte kältere kalten kühle kühlere',
		'(?:heiße|warme|kalte|kühle|heißere|wärmere|kältere|kühlere)n? Temperatur(?:en)?',
		'Things are hot; temperatures are high.',
		{ mend: 'Say “hohe” or “niedrige”.' }
	),
	trap(
		'zero-gravity',
		'keine null ohne',
		'(?:keine|null|ohne) (?:Schwerkraft|Gravitation)',
		'Gravity reaches out there too: in a low orbit it is nearly as strong as on the ground.',
		{ mend: 'Say “schwerelos” or “im freien Fall”.' }
	),
	trap(
		'dark-side',
		'dunkle dunklen',
		'dunklen? Seite des Mondes',
		'The far side of the Moon has as much day as the near side.',
		{ replacement: () => 'Rückseite des Mondes' }
	),
	trap(
		'sucked-in',
		'saugt saugen eingesaugt angesaugt aufgesaugt',
		'saug(?:t|en)~ (?:ein|an|auf)|(?:ein|an|auf)gesaugt',
		'Neither a vacuum nor a black hole sucks: pressure pushes, gravity pulls.',
		{ mend: 'Say “fällt hinein” or “wird hineingedrückt”.' }
	),
	trap(
		'up-to-or-more',
		'bis',
		'bis zu~ (?:oder (?:sogar )?(?:mehr|höher|länger|weiter)|und (?:darüber|mehr))',
		'“Bis zu … oder mehr” says nothing: it names every number.',
		{ mend: 'Give the range, or the most that was seen.' }
	),
	trap(
		'one-in-more',
		'1 eine einer eines jeder jede jedes',
		'(?:1|eine[rs]?) von # (?:mal )?(?:mehr|weniger|höher|häufiger)|jede[rs]? [\\p{L}]+te (?:mehr|weniger|häufiger)',
		'A share and a comparison are run together here.',
		{ mend: 'Give both shares.' }
	),
	trap(
		'passive-known',
		'es bekanntlich man',
		'es ist (?:allgemein |wohl)?bekannt|es wird (?:angenommen|vermutet|geglaubt)|bekanntlich|man (?:weiß|glaubt|nimmt an)',
		'Who knows it?',
		{ mend: 'Say who found it and how, or just state it with its source.' }
	),
	trap(
		'passive-known',
		'forscher forschende wissenschaftler experten studien',
		'(?:Forscher|Forschende|Wissenschaftler|Experten) (?:sagen|glauben|denken|meinen|wissen)|Studien (?:zeigen|belegen|sagen)',
		'Which ones?',
		{ mend: 'Name the people or the study, with its year.' }
	),
	trap(
		'goes-stale',
		'kürzlich neulich unlängst derzeit aktuell momentan heutzutage jüngst letztes letzten nächstes nächsten neueste neuesten neue',
		'kürzlich|neulich|unlängst|derzeit|aktuell|momentan|heutzutage|jüngst|(?:letzte[ns]|nächste[ns]) (?:Jahr|Monat|Woche|Sommer|Winter)s?|neue(?:ste[n]?)? (?:Studien?|Ergebnisse|Daten|Messungen)',
		'A reader may meet this in five years.',
		{ mend: 'Give the year.' }
	),
	trap(
		'superlative',
		'der die das den dem einzigartig einmalig beispiellos rekordverdächtig',
		'(?:der|die|das|den|dem) (?:aller)?(?:erste|einzige|[\\p{L}]+[sß]te)n?(?: [\\p{L}]+){0,3} (?:aller Zeiten|der Welt|überhaupt|jemals|im Universum|der Geschichte|bisher)|einzigartig|einmalig|beispiellos|rekordverdächtig',
		'A superlative needs a source that looked at all the others.',
		{ mend: 'Name who counted and when, or say “zu den größten”.' }
	),
	// Million, Milliarde, Billion, Billiarde: the long scale. Common practice.
	trap(
		'false-friend',
		'billion billionen trillion trillionen',
		'(?:B|Tr)illion(?:en)?',
		'German “Billion” is a million million, 10¹²; English “billion” is “Milliarde”.',
		{ mend: 'Check the power of ten against the source.' }
	),
	trap(
		'click-here',
		'klicken klick hier mehr',
		'klick(?:en Sie)? hier|hier klicken|mehr (?:dazu )?hier',
		'Heard alone, this link doesn’t say where it goes.',
		{ mend: 'Make the name of the page the link.' }
	),
	trap(
		'see-left',
		'siehe links rechts bild abbildung grafik diagramm',
		'siehe (?:links|rechts)|(?:Bild|Abbildung|Grafik|Diagramm) (?:links|rechts)|(?:links|rechts) (?:im Bild|zu sehen|abgebildet)',
		'On a phone there is no left or right: all stands in one column.',
		{ mend: 'Name the chart or the picture.' }
	),
	trap(
		'colour-only',
		'rote roten blaue blauen grüne grünen gelbe gelben orange violette lila rosa graue grauen schwarze schwarzen braune braunen roter blauer grüner gelber grauer',
		`${COLOURS} ${DRAWN}`,
		'Not everyone sees this colour.',
		{ mend: 'Add its name or its shape.' }
	)
];
