import type { ChartWords } from './shelf.ts';

export const de: ChartWords = {
	table: 'Das Diagramm in Worten und als Tabelle',
	tableRegion: (title) => `Tabelle zum Diagramm: ${title}`,
	item: 'Name',
	part: 'Teil',
	total: 'zusammen',
	uncertainty: 'Standardunsicherheit',
	source: 'Quelle',
	now: 'Wie eingestellt',
	noReading: 'kein Wert',
	nothing: 'Bei diesen Einstellungen gibt es nichts zu zeichnen.',

	bothEven: 'beide Achsen gleichmäßig',
	bothLog: 'beide Achsen logarithmisch',
	upLog: 'senkrechte Achse logarithmisch, waagerechte gleichmäßig',
	levelLog: 'senkrechte Achse gleichmäßig, waagerechte logarithmisch',
	logScale: (step) => `logarithmische Achse: ${step}`,
	step: (factor) => `jeder Schritt ist das ${factor}fache`,
	unevenStep: 'gleiche Abstände sind gleiche Faktoren',
	factors: { 10: 'Zehn', 100: 'Hundert', 1000: 'Tausend' },
	cut: (start) => `die Achse beginnt bei ${start}`,
	power: (amount) => `1 auf der Achse heißt ${amount}`,
	powers: { 3: 'tausend', 6: 'eine Million', 9: 'eine Milliarde', 12: 'eine Billion' },
	base: (start) => `gezählt ab ${start}`,
	at: (value) => `bei ${value}`,
	fromTo: (low, high) => `von ${low} bis ${high}`,

	band: (whole) => `Schraffiert: ${whole}.`,
	whisker: 'Ein Fehlerbalken reicht zu jeder Seite eine Standardunsicherheit weit.',
	gap: (range, label, message) => `Kein Wert${label && ` für ${label}`} ${range}: ${message}`,
	refused: (label, message) => `${label}: kein Wert. ${message}`,
	notAboveZero: (label) =>
		`${label} liegt nicht über 0 und hat auf einer logarithmischen Achse keinen Platz; die Zahl steht in der Tabelle.`,
	partlyNotAboveZero: (label) =>
		`Wo ${label} nicht über 0 liegt, ist auf einer logarithmischen Achse kein Platz; die Zahlen stehen in der Tabelle.`,
	tooShort: (label) => `${label}: Der Balken ist in diesem Maßstab zu kurz, um ihn zu sehen.`,
	tooThin: (label) => `${label}: Der Teil ist in diesem Maßstab zu schmal, um ihn zu sehen.`,
	tooSmall: (label) =>
		`${label} ist in diesem Maßstab zu klein, um es gut zu sehen: Es liegt im Ring.`,
	noShape: (label) => `${label} liegt unter 0, und so groß ist keine Form.`,
	byArea: 'Nach Fläche gezeichnet: Die doppelte Zahl ist die doppelte Fläche.',
	byWidth:
		'Nach Breite gezeichnet: Die doppelte Zahl ist doppelt so breit. Vergleichen Sie Breiten, nicht Flächen.',
	negativePart: (label) =>
		`${label} liegt unter 0, und was gestapelt wird, muss sich von 0 an summieren: Diese Säule ist nicht gezeichnet.`,
	partRefused: (label, message) =>
		`${label}: kein Wert, darum hat diese Säule keine Summe. ${message}`,
	rounded: (sum, total) =>
		`Die gerundeten Teile ergeben ${sum}, die Summe ist ${total}: Jede Zahl ist für sich gerundet.`,
	visible: (range) => `Schraffiert: sichtbares Licht, Wellenlängen ${range} Nanometer.`,
	emitted: 'Gestrichelte Linien: wie ausgesandt; durchgezogene: wie beobachtet.'
};
