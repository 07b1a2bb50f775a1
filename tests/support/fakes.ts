/**
 * The demo's surroundings in one process: object store, mail and the partner's pages. Started by src/cli/demo.mjs with its
 * settings as JSON in the first argument; tells its parent when all are up and
 * who can sign in, and closes them on SIGTERM.
 */
import process from 'node:process';
import { DEMO_PASSPHRASE, DEMO_PEOPLE } from '../../src/lib/server/demo/people.ts';
import { startMail } from './fakes/mail.ts';
import { startObjectStore } from './fakes/object-store.ts';
import { startPartner } from './fakes/partner.ts';

const settings = JSON.parse(process.argv[2] ?? '{}') as {
	storePort: number;
	storeFolder: string;
	storeAccessKey: string;
	smtpPort: number;
	mailPort: number;
	mailFolder: string;
	partnerPort: number;
	steelyard: string;
};

const store = await startObjectStore({
	port: settings.storePort,
	folder: settings.storeFolder,
	accessKey: settings.storeAccessKey
});
const mail = await startMail({
	smtpPort: settings.smtpPort,
	trayPort: settings.mailPort,
	folder: settings.mailFolder
});
const partner = await startPartner({ port: settings.partnerPort, steelyard: settings.steelyard });

process.once('SIGTERM', () => {
	Promise.all([store.close(), mail.close(), partner.close()]).then(
		() => process.exit(0),
		(error: unknown) => {
			console.error(error);
			process.exit(1);
		}
	);
});
process.send?.({
	people: Object.values(DEMO_PEOPLE).map((person) => ({ ...person, passphrase: DEMO_PASSPHRASE }))
});
