import type { ChartWords } from './shelf.ts';

export const es: ChartWords = {
	table: 'El gráfico en palabras y como tabla',
	tableRegion: (title) => `Tabla del gráfico: ${title}`,
	item: 'Nombre',
	part: 'Parte',
	total: 'en total',
	uncertainty: 'incertidumbre típica',
	source: 'Fuente',
	now: 'Con el ajuste actual',
	noReading: 'sin valor',
	nothing: 'Con estos ajustes no hay nada que dibujar.',

	bothEven: 'ambas escalas uniformes',
	bothLog: 'ambas escalas logarítmicas',
	upLog: 'escala vertical logarítmica, horizontal uniforme',
	levelLog: 'escala vertical uniforme, horizontal logarítmica',
	logScale: (step) => `escala logarítmica: ${step}`,
	step: (factor) => `cada paso multiplica por ${factor}`,
	unevenStep: 'a distancias iguales, factores iguales',
	factors: { 10: 'diez', 100: 'cien', 1000: 'mil' },
	cut: (start) => `el eje empieza en ${start}`,
	power: (amount) => `1 en el eje equivale a ${amount}`,
	powers: { 3: 'mil', 6: 'un millón de', 9: 'mil millones de', 12: 'un billón de' },
	base: (start) => `se cuenta desde ${start}`,
	at: (value) => `en ${value}`,
	fromTo: (low, high) => `de ${low} a ${high}`,

	band: (whole) => `Rayado: ${whole}.`,
	whisker: 'Cada barra de error abarca una incertidumbre típica a cada lado.',
	gap: (range, label, message) => `Sin valor${label && ` de ${label}`} ${range}: ${message}`,
	refused: (label, message) => `${label}: sin valor. ${message}`,
	notAboveZero: (label) =>
		`${label} no es mayor que 0 y no cabe en una escala logarítmica; la tabla da su número.`,
	partlyNotAboveZero: (label) =>
		`Donde ${label} no es mayor que 0 no cabe en una escala logarítmica; la tabla da los números.`,
	tooShort: (label) => `${label}: su barra es demasiado corta para verse a esta escala.`,
	tooThin: (label) => `${label}: su parte es demasiado fina para verse a esta escala.`,
	tooSmall: (label) =>
		`${label} es demasiado pequeño para verse bien a esta escala: está dentro del anillo.`,
	noShape: (label) => `${label} es menor que 0, y ninguna figura tiene ese tamaño.`,
	byArea: 'Dibujado por área: el doble del número es el doble del área.',
	byWidth:
		'Dibujado por anchura: el doble del número es el doble de ancho. Compare anchuras, no áreas.',
	negativePart: (label) =>
		`${label} es menor que 0, y lo que se apila debe sumar desde 0: esta columna no se dibuja.`,
	partRefused: (label, message) =>
		`${label}: sin valor, así que esta columna no tiene total. ${message}`,
	rounded: (sum, total) =>
		`Las partes redondeadas suman ${sum} y el total es ${total}: cada número se redondea por separado.`,
	visible: (range) => `Rayado: luz visible, longitudes de onda ${range} nanómetros.`,
	emitted: 'Líneas discontinuas: como se emitieron; continuas: como se observan.'
};
