import type { ReaderWords } from './en.ts';

export const es: ReaderWords = {
	stepLess: 'un paso menos',
	stepMore: 'un paso más',
	notANumber: 'Escriba un número.',
	outsideRange: (low, high) => `Aquí se puede ir de ${low} a ${high}.`,
	asInTheStory: 'Como en el relato',
	cantTell: 'Lo que esto no puede decir:',
	yourGuess: 'Su estimación',
	takeGuess: 'Esta es mi estimación',
	skipGuess: 'Mostrar sin estimar',
	guessed: (guess) => `Usted estimó ${guess}.`,
	reads: (reading) => `El cálculo da ${reading}.`,
	guessTimes: (times, isMore) =>
		isMore ? `Su estimación es ${times} veces eso.` : `Es ${times} veces su estimación.`,
	guessClose: 'Se acerca mucho.',
	guessAgain: 'Estimar de nuevo',
	sources: 'Fuentes',
	source: 'Fuente',
	credit: (name, licence) => [name, licence].filter(Boolean).join(', '),
	quantity: 'Magnitud',
	noReading: 'sin valor',
	withValues: 'Con',
	table: 'Los números en una tabla',
	linkOutside: (asked, low, high, stands) =>
		`El enlace que ha seguido pide ${asked}. El control va de ${low} a ${high}, así que está en ${stands}.`,
	howDoWeKnow: '¿Cómo lo sabemos?',
	askHint: 'tras un número: púlselo para preguntar cómo lo sabemos.',
	close: 'Cerrar',
	checkedBy: 'Comprobado por',
	onDay: (name, day) => `${name}, el ${day}`,
	restsOn: 'Se apoya en',
	showWorking: 'Mostrar el cálculo',
	noNumberHere: 'aquí no hay número',
	atFirst: (says) => `En la primera posición: ${says}`,
	tellsOfFirst: (settings) => `Estas palabras valen para la primera posición. ${settings}.`,
	readsWords: (words) => `La calculadora da ${words}.`,
	readsNow: (reading) => `Antes de redondear, la calculadora da ${reading} en esta posición.`,
	giveOrTake: (reading, spread) => `${reading}, con un margen de ${spread}`,
	folded: (withNote) =>
		withNote
			? 'El gráfico y la nota sobre sus límites quedan plegados mientras esto está abierto.'
			: 'El gráfico queda plegado mientras esto está abierto.',
	unfold: () => 'Mostrar',
	frameName: (title) => `${title}, explicación interactiva`,
	still: 'Se lee tal como se publicó. Con los scripts activados, los números siguen a un control.',
	release: (number, day) => `edición ${number}, ${day}`,
	reset: 'Restablecer',
	textVersion: 'Versión en texto y quién lo hizo y comprobó',
	noNumberAtSetting: 'En esta posición no hay número que dar.'
};
