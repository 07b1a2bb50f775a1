import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import type { WidgetDocument } from '../widget/document.ts';
import { Autosave, type TakenIn, type TheirVersion } from './autosave.svelte.ts';
import type { Journal, JournalEntry } from './journal.ts';
import type { OpenAsk } from './keep-asks.ts';
import { PatientJournal } from './patient-journal.svelte.ts';

const EMPTY: WidgetDocument = {
	version: 2,
	language: 'en',
	constants: '2026.1',
	title: '',
	point: '',
	formulas: [],
	steps: [],
	controls: [],
	blocks: [],
	claims: []
};

class MemoryJournal implements Journal {
	entry: JournalEntry | null = null;
	aside: JournalEntry[] = [];
	asks: OpenAsk[] = [];
	read = () => Promise.resolve([]);
	letGo = () => Promise.resolve();
	write = (entry: JournalEntry) => {
		this.entry = entry;
		return Promise.resolve();
	};
	clear = () => {
		this.entry = null;
		return Promise.resolve();
	};
	setAside = (entry: JournalEntry) => {
		this.aside.push(entry);
		return Promise.resolve();
	};
	listAside = () => Promise.resolve([...this.aside]);
	dropAside = (at: string) => {
		this.aside = this.aside.filter((entry) => entry.at !== at);
		return Promise.resolve();
	};
	keepAsk = (ask: OpenAsk) => {
		this.asks = [...this.asks.filter(({ id }) => id !== ask.id), ask];
		return Promise.resolve();
	};
	listAsks = () => Promise.resolve([...this.asks]);
	dropAsk = (id: string) => {
		this.asks = this.asks.filter((ask) => ask.id !== id);
		return Promise.resolve();
	};
	close = () => undefined;
}

/** A server that keeps versions as the real one does, and can be taken away. */
class Server {
	version = 1;
	document: WidgetDocument = EMPTY;
	away = false;
	answer: Response | null = null;
	/** It keeps what it gets and goes down before it can say so. */
	dropsAnswers = false;
	requests: { baseVersion: number; document: WidgetDocument }[] = [];

	fetch = (_address: unknown, init?: RequestInit): Promise<Response> => {
		if (this.away) return Promise.reject(new TypeError('fetch failed'));
		const body = JSON.parse(init?.body as string) as Server['requests'][number];
		this.requests.push(body);
		if (this.answer) return Promise.resolve(this.answer.clone());
		if (body.baseVersion !== this.version) {
			return Promise.resolve(
				Response.json(
					{
						error: {
							code: 'version-conflict',
							details: {
								version: this.version,
								savedAt: '2026-12-08T09:02:00.000Z',
								savedBy: { personId: 'p-2', name: 'Kofi Adjarra-Lund' },
								document: this.document
							}
						}
					},
					{ status: 409 }
				)
			);
		}
		this.version += 1;
		this.document = body.document;
		if (this.dropsAnswers) return Promise.reject(new TypeError('fetch failed'));
		return Promise.resolve(
			Response.json({ version: this.version, savedAt: new Date().toISOString() })
		);
	};
}

describe('autosave', () => {
	let server: Server;
	let journal: MemoryJournal;
	let title: string;
	let autosave: Autosave;
	/** What merging makes of both: here the two titles, one after the other. */
	let takeIn: (base: unknown, theirs: TheirVersion) => TakenIn;

	const autosaveWith = (fetch: typeof globalThis.fetch, kept: Journal | PatientJournal) =>
		new Autosave(
			{
				address: '/api/pieces/first-light/draft',
				journal: kept instanceof PatientJournal ? kept : new PatientJournal(kept),
				fetch,
				now: () => new Date(),
				draft: () => ({ ...EMPTY, title }),
				takeIn: (...both) => takeIn(...both)
			},
			{ version: 1, savedAt: '2026-12-08T08:59:00.000Z', document: EMPTY }
		);

	const type = (text: string) => {
		title += text;
		autosave.changed();
	};
	const pass = (ms: number) => vi.advanceTimersByTimeAsync(ms);

	beforeEach(() => {
		vi.useFakeTimers({ now: new Date('2026-12-08T09:00:00Z') });
		server = new Server();
		journal = new MemoryJournal();
		title = '';
		takeIn = vi.fn((_base: unknown, theirs: TheirVersion): TakenIn => {
			title = `${(theirs.document as WidgetDocument).title} ${title}`;
			autosave.changed();
			return 'taken';
		});
		autosave = autosaveWith(server.fetch, journal);
	});

	afterEach(() => {
		autosave.stop();
		vi.useRealTimers();
	});

	test('a pause of 400 ms after typing keeps the draft once', async () => {
		type('F');
		await pass(300);
		type('i');
		await pass(399);
		expect(server.requests).toHaveLength(0);
		expect(autosave.state.name).toBe('unsynced');
		await pass(1);
		expect(server.requests).toEqual([{ baseVersion: 1, document: { ...EMPTY, title: 'Fi' } }]);
		expect(autosave.state.name).toBe('kept');
		expect(autosave.version).toBe(2);
		expect(autosave.keptAt).toBe('2026-12-08T09:00:00.700Z');
	});

	test('typing without a pause is kept every two seconds all the same', async () => {
		for (let i = 0; i < 30; i += 1) {
			type('x');
			await pass(100);
		}
		expect(server.requests.length).toBeGreaterThanOrEqual(1);
	});

	test('the journal has the words within 200 ms and is cleared when the server says kept', async () => {
		type('F');
		await pass(200);
		expect(journal.entry).toMatchObject({ baseVersion: 1, document: { title: 'F' } });
		await pass(200);
		expect(autosave.state.name).toBe('kept');
		expect(journal.entry).toBeNull();
	});

	test('a server that goes away loses nothing, and gets everything when it is back', async () => {
		server.away = true;
		type('First');
		await pass(400);
		expect(autosave.state).toEqual({ name: 'away', tries: 1 });
		type(' light');
		await pass(200);
		expect(journal.entry).toMatchObject({ document: { title: 'First light' } });
		await pass(5_000);
		expect(autosave.state.name).toBe('away');
		server.away = false;
		await pass(15_000);
		expect(autosave.state.name).toBe('kept');
		expect(server.document.title).toBe('First light');
		expect(journal.entry).toBeNull();
	});

	test('retries back off and never wait longer than 15 s', async () => {
		server.away = true;
		const tries: number[] = [];
		type('x');
		for (let second = 0; second < 60; second += 1) {
			await pass(1_000);
			if (autosave.state.name === 'away') tries.push(autosave.state.tries);
		}
		expect(tries.at(-1)).toBeGreaterThanOrEqual(6);
		expect(tries.at(-1)).toBeLessThanOrEqual(9);
	});

	test('words typed while the server is answering are sent after', async () => {
		let answer: (response: Response) => void = () => undefined;
		const fetchOnce = vi
			.fn(server.fetch)
			.mockImplementationOnce(() => new Promise((resolve) => (answer = resolve)));
		autosave = autosaveWith(fetchOnce, journal);
		type('a');
		await pass(400);
		type('b');
		answer(Response.json({ version: 1, savedAt: '2026-12-08T09:00:01.000Z' }));
		await pass(0);
		expect(autosave.state.name).toBe('unsynced');
		await pass(1_000);
		expect(server.document.title).toBe('ab');
		expect(autosave.state.name).toBe('kept');
	});

	test('a lost sign-in keeps the text and goes on after signing in again', async () => {
		server.answer = Response.json({ error: { code: 'not-signed-in' } }, { status: 401 });
		type('x');
		await pass(400);
		expect(autosave.state.name).toBe('signed-out');
		expect(journal.entry).toMatchObject({ document: { title: 'x' } });
		type('y');
		await pass(2_000);
		expect(server.requests).toHaveLength(1);
		server.answer = null;
		await autosave.tryNow();
		expect(server.document.title).toBe('xy');
	});

	test('a refused draft shows what is wrong, and the next change tries again', async () => {
		server.answer = Response.json(
			{
				error: {
					message: 'This document doesn’t hang together.',
					details: { issues: [{ path: 'steps', message: 'Cut one tie.' }] }
				}
			},
			{ status: 422 }
		);
		type('x');
		await pass(400);
		expect(autosave.state).toEqual({
			name: 'refused',
			issues: [{ path: 'steps', message: 'Cut one tie.' }]
		});
		server.answer = null;
		type('y');
		await pass(400);
		expect(autosave.state.name).toBe('kept');
	});

	test('a save whose answer was lost is no conflict with oneself', async () => {
		server.dropsAnswers = true;
		type('First');
		await pass(400);
		expect(autosave.state.name).toBe('away');
		server.dropsAnswers = false;
		type(' light');
		server.away = true;
		await pass(3_000);
		server.away = false;
		await pass(15_000);
		expect(autosave.state.name).toBe('kept');
		expect(server.document.title).toBe('First light');
		expect(server.version).toBe(3);
	});

	test('a server that never answers is given up on and counts as away', async () => {
		const signals: (AbortSignal | null | undefined)[] = [];
		const never = vi.fn<typeof fetch>((_address, init) => {
			signals.push(init?.signal);
			return Promise.reject(new DOMException('The operation timed out.', 'TimeoutError'));
		});
		autosave = autosaveWith(never, journal);
		type('x');
		await pass(400);
		expect(signals[0]).toBeInstanceOf(AbortSignal);
		expect(autosave.state).toEqual({ name: 'away', tries: 1 });
	});

	test('keeping everything waits for the save under way', async () => {
		let answer: (response: Response) => void = () => undefined;
		const slowOnce = vi
			.fn(server.fetch)
			.mockImplementationOnce(() => new Promise((resolve) => (answer = resolve)));
		autosave = autosaveWith(slowOnce, journal);
		type('a');
		await pass(400);
		type('b');
		const all = autosave.keepAll();
		answer(Response.json({ version: 1, savedAt: '2026-12-08T09:00:01.000Z' }));
		expect(await all).toBe(true);
		expect(server.document.title).toBe('ab');
	});

	describe('when this browser keeps no copy', () => {
		const full = () => Promise.reject(new DOMException('No room.', 'QuotaExceededError'));
		const silent = () => new Promise<never>(() => undefined);
		test.each([
			['it is full', full],
			['it never answers', silent]
		])('because %s, the server does all the same', async (_, fails) => {
			Object.assign(journal, { write: fails, clear: fails, setAside: fails });
			const patient = new PatientJournal(journal);
			autosave = autosaveWith(server.fetch, patient);
			server.answer = Response.json({ error: { code: 'not-signed-in' } }, { status: 401 });
			type('x');
			await pass(400);
			expect(autosave.state.name).toBe('signed-out');
			await pass(2_000);
			expect(patient.works).toBe(false);
			server.answer = null;
			await autosave.tryNow();
			expect(autosave.state.name).toBe('kept');
			expect(server.document.title).toBe('x');
		});
	});

	describe('when someone else saved in between', () => {
		const theirs = (words: string) => {
			server.version += 3;
			server.document = { ...EMPTY, title: words };
		};

		test('their version is merged in over the last one both had, and the result is kept', async () => {
			theirs('Theirs');
			type('Mine');
			await pass(400);
			expect(takeIn).toHaveBeenCalledExactlyOnceWith(
				EMPTY,
				expect.objectContaining({
					version: 4,
					savedBy: { personId: 'p-2', name: 'Kofi Adjarra-Lund' },
					document: { ...EMPTY, title: 'Theirs' }
				})
			);
			await pass(2_000);
			expect(server.requests.at(-1)).toEqual({
				baseVersion: 4,
				document: { ...EMPTY, title: 'Theirs Mine' }
			});
			expect(autosave.state.name).toBe('kept');
			expect(journal.entry).toBeNull();
		});

		test('the next merge starts from what was kept last', async () => {
			type('Mine');
			await pass(400);
			theirs('Theirs');
			type('!');
			await pass(400);
			expect(takeIn).toHaveBeenCalledExactlyOnceWith(
				{ ...EMPTY, title: 'Mine' },
				expect.objectContaining({ version: 5 })
			);
			await pass(2_000);
			theirs('Again');
			type('?');
			await pass(400);
			expect(takeIn).toHaveBeenLastCalledWith(
				{ ...EMPTY, title: 'Theirs Mine!' },
				expect.objectContaining({ version: 9 })
			);
		});

		test('what the journal holds says what it grew from', async () => {
			theirs('Theirs');
			server.away = true;
			type('Mine');
			await pass(600);
			expect(journal.entry).toMatchObject({ baseVersion: 1, base: EMPTY });
			server.away = false;
			autosave.online();
			await pass(0);
			expect(journal.entry).toMatchObject({ baseVersion: 4, base: { title: 'Theirs' } });
		});

		test('a version that can’t be read stops the keeping, and the words stay here', async () => {
			takeIn = vi.fn((): TakenIn => 'unreadable');
			autosave = autosaveWith(server.fetch, journal);
			theirs('From a newer house');
			type('Mine');
			await pass(400);
			expect(autosave.state).toMatchObject({ name: 'unreadable', theirs: { version: 4 } });
			type('!');
			await pass(5_000);
			expect(server.requests).toHaveLength(1);
			expect(journal.entry).toMatchObject({ document: { title: 'Mine!' } });
		});

		test('while one’s own words don’t hang together, the server is asked what is wrong with them', async () => {
			takeIn = vi.fn((): TakenIn => 'unfinished');
			autosave = autosaveWith(server.fetch, journal);
			theirs('Theirs');
			type('Mine');
			await pass(400);
			server.answer = Response.json(
				{ error: { details: { issues: [{ path: 'title', message: 'Too long.' }] } } },
				{ status: 422 }
			);
			await pass(1_000);
			expect(autosave.state).toMatchObject({ name: 'refused', issues: [{ path: 'title' }] });
			expect(autosave.version).toBe(1);
		});

		test('keeping everything waits for the merge too', async () => {
			theirs('Theirs');
			type('Mine');
			expect(await autosave.keepAll()).toBe(true);
			expect(server.document.title).toBe('Theirs Mine');
		});

		test('words that a window left behind go on from what they grew from', async () => {
			theirs('Theirs');
			autosave.goOnFrom({ baseVersion: 2, base: { of: 'two' }, document: null, at: '' });
			type('Left');
			await pass(400);
			expect(server.requests[0]).toMatchObject({ baseVersion: 2 });
			expect(takeIn).toHaveBeenCalledExactlyOnceWith({ of: 'two' }, expect.anything());
		});
	});
});
