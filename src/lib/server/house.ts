/** The running house: opened once at start, kept for the life of the process, closed in order. */
import { passphraseFits } from './auth/passphrase.ts';
import type { Fixtures } from './context.ts';
import { openDatabase } from './db/client.ts';
import { newId } from './db/ids.ts';
import { seed } from './db/seed.ts';
import { readEnv, type Env } from './env.ts';
import { startSender, type Sender } from './jobs/sender.ts';
import { startSweeper, type Sweeper } from './jobs/sweeper.ts';
import { logLine } from './log.ts';
import { openMailTransport } from './mail/transport.ts';
import { sweepPictures } from './pictures/keep.ts';
import { sweepDrafts } from './services/history.ts';
import { restockShelf } from './services/restock-shelf.ts';
import { shelveThemes } from './services/themes.ts';
import { shelfOf } from './shelf/shelf.ts';
import { openObjectStore } from './store/object-store.ts';

export interface House {
	/** The app's own origin; what a browser sends as Origin from our pages. */
	origin: string;
	fixtures: Fixtures;
	close(): Promise<void>;
}

/** Locks, opens, migrates, seeds, puts releases before readers, and starts the mail sender. */
export async function openHouse(env: Env): Promise<House> {
	const database = await openDatabase({
		dataDir: env.STEELYARD_DATA_DIR,
		migrations: env.STEELYARD_MIGRATIONS
	});
	const store = openObjectStore({
		endpoint: env.STORE_ENDPOINT,
		bucket: env.STORE_BUCKET,
		region: env.STORE_REGION,
		accessKeyId: env.STORE_ACCESS_KEY,
		secretAccessKey: env.STORE_SECRET_KEY
	});
	const transport = openMailTransport({
		smtpUrl: env.SMTP_URL,
		from: env.MAIL_FROM,
		houseName: env.HOUSE_NAME
	});
	let sender: Sender | null = null;
	const sweepers: Sweeper[] = [];
	const close = async () => {
		await sender?.stop();
		for (const sweeper of sweepers) await sweeper.stop();
		transport.close();
		store.close();
		await database.close();
	};

	const fixtures: Fixtures = {
		db: database.db,
		store,
		shelf: shelfOf(env.STEELYARD_DATA_DIR),
		mail: { wake: () => sender?.wake() },
		house: { name: env.HOUSE_NAME, origin: env.ORIGIN },
		pressFolder: env.STEELYARD_PRESS,
		secret: env.AUTH_SECRET
	};
	try {
		await seed(fixtures, env.STEELYARD_SEED);
		const restocked = await restockShelf(fixtures);
		await shelveThemes(fixtures);
		if (restocked.missing.length > 0) logLine('error', 'releases-missing', { ...restocked });
		sender = startSender({
			db: database.db,
			house: { ...fixtures.house, secret: env.AUTH_SECRET },
			transport,
			clock: () => new Date(),
			report: (message) => logLine('warn', 'mail', { message })
		});
		const clock = () => new Date();
		sweepers.push(
			startSweeper({
				sweep: (now) => sweepPictures(fixtures, now),
				removedSentence: (removed) =>
					`Interrupted uploads had left ${removed} files; they are removed.`,
				failed: 'Pictures couldn’t be swept',
				clock,
				report: (message) => logLine('warn', 'pictures', { message })
			}),
			startSweeper({
				sweep: (now) => sweepDrafts(fixtures, now),
				removedSentence: (removed) => `${removed} drafts older than ninety days are let go.`,
				failed: 'Earlier drafts couldn’t be swept',
				clock,
				report: (message) => logLine('info', 'drafts', { message })
			})
		);
		// The decoy for unknown accounts is made now, so that the first one doesn't take longer.
		await passphraseFits(null, newId());
		return { origin: env.ORIGIN, fixtures, close };
	} catch (error) {
		await close();
		throw error;
	}
}

/** On globalThis, since a development server loads this module anew after each edit. */
const KEPT = Symbol.for('steelyard.house');
type Keeper = typeof globalThis & { [KEPT]?: Promise<House>; [OPEN]?: House };
const OPEN = Symbol.for('steelyard.house.open');

export async function openHouseOnce(): Promise<House> {
	const keeper = globalThis as Keeper;
	keeper[KEPT] ??= openHouse(readEnv()).then((opened) => {
		keeper[OPEN] = opened;
		// The server's entry waits for what this returns.
		process.once('sveltekit:shutdown', () => opened.close());
		return opened;
	});
	return keeper[KEPT];
}

/** The open house; throws before `openHouseOnce` has resolved, which SvelteKit waits for. */
export function house(): House {
	const opened = (globalThis as Keeper)[OPEN];
	if (!opened) throw new Error('The house isn’t open yet.');
	return opened;
}
