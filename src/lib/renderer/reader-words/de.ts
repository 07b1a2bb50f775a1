import type { ReaderWords } from './en.ts';

export const de: ReaderWords = {
	stepLess: 'einen Schritt weniger',
	stepMore: 'einen Schritt mehr',
	notANumber: 'Bitte eine Zahl eingeben.',
	outsideRange: (low, high) => `Hier geht es von ${low} bis ${high}.`,
	asInTheStory: 'Wie in der Geschichte',
	cantTell: 'Was sich daran nicht ablesen lässt:',
	yourGuess: 'Ihre Schätzung',
	takeGuess: 'So schätze ich',
	skipGuess: 'Ohne Schätzung zeigen',
	guessed: (guess) => `Geschätzt haben Sie ${guess}.`,
	reads: (reading) => `Die Rechnung ergibt ${reading}.`,
	guessTimes: (times, isMore) =>
		isMore
			? `Ihre Schätzung ist das ${times}-Fache davon.`
			: `Das ist das ${times}-Fache Ihrer Schätzung.`,
	guessClose: 'Das liegt nahe dran.',
	guessAgain: 'Noch einmal schätzen',
	sources: 'Quellen',
	source: 'Quelle',
	credit: (name, licence) => [name, licence].filter(Boolean).join(', '),
	quantity: 'Größe',
	noReading: 'kein Wert',
	withValues: 'Mit',
	table: 'Die Zahlen als Tabelle',
	linkOutside: (asked, low, high, stands) =>
		`Der Link, dem Sie gefolgt sind, verlangt ${asked}. Der Schieber geht von ${low} bis ${high} und steht deshalb bei ${stands}.`,
	howDoWeKnow: 'Woher wissen wir das?',
	askHint: 'nach einer Zahl: antippen und fragen, woher wir das wissen.',
	close: 'Schließen',
	checkedBy: 'Geprüft von',
	onDay: (name, day) => `${name}, am ${day}`,
	restsOn: 'Beruht auf',
	showWorking: 'Rechenweg zeigen',
	noNumberHere: 'hier keine Zahl',
	atFirst: (says) => `Bei der ersten Einstellung: ${says}`,
	tellsOfFirst: (settings) => `Diese Worte gelten für die erste Einstellung. ${settings}.`,
	readsWords: (words) => `Der Rechner zeigt ${words}.`,
	readsNow: (reading) => `Vor dem Runden zeigt der Rechner bei dieser Einstellung ${reading}.`,
	giveOrTake: (reading, spread) => `${reading}, plus oder minus ${spread}`,
	folded: (withNote) =>
		withNote
			? 'Das Diagramm und der Hinweis auf seine Grenzen sind eingeklappt, solange dies offen ist.'
			: 'Das Diagramm ist eingeklappt, solange dies offen ist.',
	unfold: () => 'Zeigen',
	frameName: (title) => `${title}, interaktive Erklärung`,
	still: 'Der Text steht wie veröffentlicht. Mit Skripten folgen die Zahlen einem Schieber.',
	release: (number, day) => `Ausgabe ${number}, ${day}`,
	reset: 'Zurücksetzen',
	textVersion: 'Textfassung, und wer dies gemacht und geprüft hat',
	noNumberAtSetting: 'Bei dieser Einstellung gibt es keine Zahl.'
};
