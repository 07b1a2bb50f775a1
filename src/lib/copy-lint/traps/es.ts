/**
 * Spanish traps. Where a comment names no source, the rule is common practice of the copy desk; units follow the BIPM,
 * The International System of Units (SI Brochure), 9th edition, 2019, looking and links W3C, WCAG 2.2, 2023.
 */
import { trapsFor, type Trap } from './trap.ts';

const trap = trapsFor(
	'(?:medio|cien|mil|mill(?:ón|ones)|bill(?:ón|ones))(?: de)?|mil millones(?: de)?|un[oa]?|dos|tres|cuatro|cinco|seis|siete|ocho|nueve|diez|veinte|muchas?|varias?|unos'
);

const COLOURS =
	'(?:roj[oa]s?|azul(?:es)?|verdes?|amarill[oa]s?|naranjas?|violetas?|moradas?|rosas?|gris(?:es)?|negr[oa]s?)';
const MASS = '(?:kg|kilogramos?|kilos?|gramos?|toneladas?|masas solares)';

export const SPANISH: readonly Trap[] = [
	trap(
		'causal-verb',
		'demuestra demuestran demostró prueba prueban probó',
		'(?:demuestran?|demostró|prueban?|probó) que',
		'A calculation doesn’t prove; it agrees or disagrees.',
		{ mend: 'Say “muestra”, “concuerda con”, or name the test.' }
	),
	trap(
		'causal-verb',
		'causa causan causó provoca provocan produce',
		'(?:causa|causan|causó|provoca|provocan) (?:el|la|los|las|un|una)',
		'This sentence states a cause, and its number is a reading, not a cause.',
		{ mend: 'Say what goes with what, or name the study that shows the cause.', wantsReading: true }
	),
	trap(
		'weighs-mass',
		'pesa pesan pesaba peso',
		`(?:pesa(?:n|ba)?)~#\\s*${MASS}|peso de~#\\s*${MASS}`,
		'Kilograms give a mass. Weight is a force, and changes from place to place.',
		{ mend: 'Say “tiene una masa de”, or give the weight in newtons.' }
	),
	trap(
		'degrees-kelvin',
		'grado grados',
		'grados? kelvin',
		'The kelvin has had no degrees since 1967.',
		{
			replacement: () => 'kelvin'
		}
	),
	trap(
		'rate-of-power',
		'kw mw gw w kilovatio kilovatios megavatio megavatios gigavatio gigavatios vatio vatios amperio amperios',
		'(?:(?:kilo|mega|giga)?vatios?|[kMG]?W|amperios?) (?:por|a la|al|cada) (?:hora|segundo|minuto|día|mes|año)|[kMG]W/h',
		'Power is a rate already: a watt is a joule each second.',
		{ mend: 'For energy say “kilovatios hora”; for power leave out the time.' }
	),
	trap(
		'knots-per-hour',
		'nudo nudos',
		'nudos? por hora',
		'A knot is a mile an hour at sea already.',
		{
			replacement: () => 'nudos'
		}
	),
	trap(
		'light-year-time',
		'hace tarda tardó tardan durante dura',
		'(?:hace|tarda(?:n)?|tardó|durante|dura)~# años[-\\s]luz',
		'A light year is a distance, not a time.',
		{ mend: 'Say how many years, or how many light years away.' }
	),
	trap(
		'times-faster',
		'veces',
		'veces (?:más|mayor(?:es)?|superior(?:es)?)',
		'“Tres veces más rápido” is three times as fast to some readers, four times to others.',
		{ mend: 'Say “el triple de”, or give both numbers.' }
	),
	trap(
		'times-less',
		'veces',
		'veces (?:menos|menor(?:es)?|inferior(?:es)?|más (?:pequeñ[oa]s?|lent[oa]s?|débil(?:es)?|cort[oa]s?|frí[oa]s?))',
		'Something can’t be ten times smaller than itself: one time smaller leaves nothing.',
		{ mend: 'Say “la décima parte de”.' }
	),
	trap(
		'centrifugal',
		'fuerza fuerzas',
		'fuerzas? centrífugas?',
		'Seen from outside nothing pushes outward: things go straight on, and a force inward bends their path.',
		{ mend: 'Say what pulls or pushes inward, or say that you turn with it.' }
	),
	trap(
		'only-a-theory',
		'solo sólo solamente mera mi nuestra',
		'(?:solo|sólo|solamente) una teoría|mera teoría|(?:mi|nuestra) teoría',
		'A theory is an explanation that has stood tests; a guess is a hypothesis.',
		{ mend: 'Say “conjetura” or “hipótesis”.' }
	),
	trap(
		'exponentially',
		'exponencialmente',
		'exponencialmente',
		'Exponential growth doubles in equal times; few things do.',
		{ mend: 'Say how much and how fast, or give the doubling time.' }
	),
	trap(
		'quantum-leap',
		'salto saltos',
		'saltos? cuánticos?',
		'A quantum leap is the smallest there is.',
		{
			mend: 'Say “un gran paso”, and how large.'
		}
	),
	trap(
		'warm-temperature',
		'temperatura temperaturas',
		'temperaturas? (?:más )?(?:calientes?|cálidas?|frías?)',
		'Things are hot; temperatures are high.',
		{ mend: 'Say “alta” or “baja”.' }
	),
	trap(
		'zero-gravity',
		'gravedad sin',
		'gravedad cero|sin gravedad',
		'Gravity reaches out there too: in a low orbit it is nearly as strong as on the ground.',
		{ mend: 'Say “ingravidez” or “en caída libre”.' }
	),
	trap(
		'dark-side',
		'cara lado',
		'(?:cara|lado) oscur[oa] de la luna',
		'The far side of the Moon has as much day as the near side.',
		{ replacement: () => 'cara oculta de la Luna' }
	),
	trap(
		'sucked-in',
		'succiona succionan succionado chupa',
		'succiona(?:n|d[oa]s?)?|chupa',
		'Neither a vacuum nor a black hole sucks: pressure pushes, gravity pulls.',
		{ mend: 'Say “cae” or “es empujado”.' }
	),
	trap(
		'up-to-or-more',
		'hasta',
		'hasta~ o (?:incluso )?más',
		'“Hasta … o más” says nothing: it names every number.',
		{ mend: 'Give the range, or the most that was seen.' }
	),
	trap(
		'one-in-more',
		'1 uno una',
		'(?:1|un[oa]) de cada # (?:veces )?(?:más|menos)',
		'A share and a comparison are run together here.',
		{ mend: 'Give both shares.' }
	),
	trap(
		'passive-known',
		'se es',
		'se (?:sabe|cree|piensa|dice|supone|considera) que|es (?:bien )?sabido que',
		'Who knows it?',
		{ mend: 'Say who found it and how, or just state it with its source.' }
	),
	trap(
		'passive-known',
		'los estudios',
		'los (?:científicos|investigadores|expertos) (?:dicen|creen|piensan|saben)|estudios (?:muestran|demuestran|dicen)',
		'Which ones?',
		{ mend: 'Name the people or the study, with its year.' }
	),
	trap(
		'goes-stale',
		'recientemente reciente recientes actualmente últimamente próximamente el hoy nuevo nuevos',
		'recientes?|recientemente|actualmente|últimamente|próximamente|el (?:año|mes|verano|invierno) (?:pasado|que viene)|el último estudio|hoy en día|nuevos? (?:estudios?|datos|resultados?)',
		'A reader may meet this in five years.',
		{ mend: 'Give the year.' }
	),
	trap(
		'superlative',
		'el la los las único única inédito',
		'(?:el|la|los|las) (?:primer[oa]?s?|mayor(?:es)?|más [\\p{L}]+|[\\p{L}]+ más [\\p{L}]+)(?: [\\p{L}]+){0,3} (?:del (?:mundo|universo)|de la historia|jamás|hasta (?:ahora|la fecha)|de todos los tiempos)|inédito',
		'A superlative needs a source that looked at all the others.',
		{ mend: 'Name who counted and when, or say “entre los mayores”.' }
	),
	// Real Academia Española, Diccionario panhispánico de dudas, “billón”: a million million.
	trap(
		'false-friend',
		'billón billones trillón trillones',
		'(?:b|tr)ill(?:ón|ones)',
		'Spanish “billón” is a million million, 10¹²; English “billion” is “mil millones”.',
		{ mend: 'Check the power of ten against the source.' }
	),
	trap(
		'click-here',
		'haga haz pulse pulsa clic más',
		'(?:haga|haz) clic(?: aquí)?|(?:pulse|pulsa) aquí|clic aquí|más (?:información )?aquí',
		'Heard alone, this link doesn’t say where it goes.',
		{ mend: 'Make the name of the page the link.' }
	),
	trap(
		'see-left',
		'véase ver gráfico imagen figura foto a',
		'(?:véase|ver) a la (?:izquierda|derecha)|(?:gráfico|imagen|figura|foto) (?:de|a) la (?:izquierda|derecha)',
		'On a phone there is no left or right: all stands in one column.',
		{ mend: 'Name the chart or the picture.' }
	),
	trap(
		'colour-only',
		'línea curva barra barras punto puntos zona banda franja flecha líneas',
		`(?:líneas?|curva|barras?|puntos?|zona|banda|franja|flecha) ${COLOURS}`,
		'Not everyone sees this colour.',
		{ mend: 'Add its name or its shape.' }
	)
];
