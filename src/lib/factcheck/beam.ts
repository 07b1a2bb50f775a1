/**
 * The beam picture: where a claim would be level, lean and tip if the reading lay elsewhere. The zones are found by
 * asking the decision procedure itself, so the picture can't disagree with the verdict.
 */
import { statedValue, type Stated } from '../widget/stated.ts';
import { decide } from './decide.ts';
import type { VerdictName } from './verdict.ts';
import { sameDimension, uncertaintyIn, type WeighedReading } from './weighing.ts';

export interface BeamZone {
	/** Departures in per cent. */
	from: number;
	to: number;
	verdict: VerdictName;
}

export interface BeamPicture {
	/** The arm's ends, in per cent of departure from what the copy says; 0 is always on it. */
	fromPercent: number;
	toPercent: number;
	/** From end to end, each a stretch of one verdict. */
	zones: BeamZone[];
	departurePercent: number;
	/** Two standard uncertainties; null where there is none, or none is known. */
	whiskerPercent: number | null;
	/** Nice numbers on the arm. */
	ticks: number[];
}

/** The level zone takes about this share of the arm where the reading isn't far off. */
const LEVEL_SHARE = 0.45;
const TICKS = 7;
/** The arm's half length where there is no level zone to go by. */
const PLAIN_REACH = 5;
/** “Exactly” is level at one point, which has no width but for the fifteenth digit. */
const NO_WIDTH = 1e-9;

/** Null where there is no departure: no reading, another dimension, or nought in the copy. */
export function beamPicture(stated: Stated, reading: WeighedReading): BeamPicture | null {
	const departure = decide(stated, reading).departurePercent;
	const v = statedValue(stated);
	if (departure === null || v === 0 || !sameDimension(reading.unit, stated.unit)) return null;

	const verdictAt = (percent: number) =>
		decide(stated, standingAt(stated, reading, v, percent)).verdict;
	const zones = scan(verdictAt, departure);
	const { from, to, ticks } = armFor(zones, departure);
	return {
		fromPercent: from,
		toPercent: to,
		zones: clip(zones, from, to),
		departurePercent: departure,
		whiskerPercent: whisker(stated, reading, v),
		ticks
	};
}

/** The same reading, standing elsewhere on the arm, in the claim's unit and with its uncertainty there. */
function standingAt(
	stated: Stated,
	reading: WeighedReading,
	v: number,
	percent: number
): WeighedReading {
	const u = uncertaintyIn(reading, stated.unit);
	const uncertainty = reading.uncertainty === 'exact' ? 'exact' : (u ?? 'not-available');
	return { ...reading, unit: stated.unit, value: v + (Math.abs(v) * percent) / 100, uncertainty };
}

function whisker(stated: Stated, reading: WeighedReading, v: number): number | null {
	const u = uncertaintyIn(reading, stated.unit);
	return u ? (2 * u * 100) / Math.abs(v) : null;
}

/** Departures to try: dense near nought, sparse far out, on both sides. */
const PROBES: readonly number[] = (() => {
	const sizes = Array.from({ length: 241 }, (_, index) => 10 ** (-4 + index / 34.2));
	return [...sizes.map((size) => -size), 0, ...sizes].sort((a, b) => a - b);
})();

const HALVINGS = 40;

/** Walks the probes and halves each stretch where the verdict changes until its edge is sharp. */
function scan(verdictAt: (percent: number) => VerdictName, departure: number): BeamZone[] {
	const probes = [...new Set([...PROBES, departure])].sort((a, b) => a - b);
	const first = probes[0] ?? 0;
	const zones: BeamZone[] = [{ from: first, to: first, verdict: verdictAt(first) }];
	for (const probe of probes.slice(1)) {
		const last = zones[zones.length - 1] as BeamZone;
		const verdict = verdictAt(probe);
		if (verdict === last.verdict) {
			last.to = probe;
			continue;
		}
		const edge = edgeBetween(verdictAt, last.to, probe, last.verdict);
		last.to = edge;
		zones.push({ from: edge, to: probe, verdict });
	}
	return zones;
}

function edgeBetween(
	verdictAt: (percent: number) => VerdictName,
	low: number,
	high: number,
	below: VerdictName
): number {
	for (let turn = 0; turn < HALVINGS; turn += 1) {
		const middle = (low + high) / 2;
		if (verdictAt(middle) === below) low = middle;
		else high = middle;
	}
	return high;
}

/**
 * Ends and ticks: nought, the level zone and the reading are on the arm. Where the reading is near enough, the level
 * zone takes 20 to 60 per cent of it; a reading far off stretches the arm, since it must be seen to be far off.
 */
function armFor(zones: readonly BeamZone[], departure: number) {
	const level = zones.filter(({ verdict }) => verdict === 'level');
	const levelFrom = Math.min(0, ...level.map(({ from }) => from));
	const levelTo = Math.max(0, ...level.map(({ to }) => to));
	const width = levelTo - levelFrom;
	const low = Math.min(levelFrom, departure);
	const high = Math.max(levelTo, departure);
	const wanted =
		width > NO_WIDTH ? width / LEVEL_SHARE : 2 * Math.max(PLAIN_REACH, Math.abs(departure) * 1.2);
	const pad = Math.max((wanted - (high - low)) / 2, (high - low) * 0.06);
	const step = niceStep((high - low + 2 * pad) / TICKS);
	const from = Math.floor((low - pad) / step + 1e-9);
	const to = Math.ceil((high + pad) / step - 1e-9);
	return {
		from: tidy(from * step),
		to: tidy(to * step),
		ticks: Array.from({ length: to - from + 1 }, (_, index) => tidy((from + index) * step))
	};
}

/** 1, 2 or 5 times a power of ten, the nearest at or above. */
function niceStep(rough: number): number {
	const power = 10 ** Math.floor(Math.log10(rough));
	return power * ([1, 2, 5].find((factor) => factor * power >= rough * 0.999) ?? 10);
}

function tidy(value: number): number {
	return Number(value.toPrecision(12));
}

function clip(zones: readonly BeamZone[], from: number, to: number): BeamZone[] {
	const inside = zones
		.filter((zone) => zone.to > from && zone.from < to)
		.map((zone) => ({ ...zone, from: Math.max(from, zone.from), to: Math.min(to, zone.to) }));
	const [first, last] = [inside[0], inside.at(-1)];
	if (first) first.from = from;
	if (last) last.to = to;
	return inside;
}
