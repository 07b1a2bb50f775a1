/** From a row of the outbox to a letter. What a row must not hold, such as a link's token, is worked out here. */
import { z } from 'zod';
import { linkToken } from '../services/sign-in.ts';
import { calculatorFlagged } from './templates/calculator-flagged.ts';
import { writeLetter, type Letter } from './templates/letter.ts';
import { queryAnswered } from './templates/query-answered.ts';
import { queryRaised } from './templates/query-raised.ts';
import { signInLink } from './templates/sign-in-link.ts';

const query = { slug: z.string(), title: z.string(), by: z.string(), claim: z.string() };

const StoredMail = z.discriminatedUnion('event', [
	z.object({ event: z.literal('sign-in-link'), input: z.object({ linkId: z.string() }) }),
	z.object({ event: z.literal('query-raised'), input: z.object(query) }),
	z.object({ event: z.literal('query-answered'), input: z.object(query) }),
	z.object({
		event: z.literal('calculator-flagged'),
		input: z.object({
			calculator: z.string(),
			title: z.string(),
			revision: z.string(),
			state: z.enum(['withdrawn', 'superseded']),
			by: z.string(),
			pieces: z.string()
		})
	})
]);

export interface MailHouse {
	name: string;
	origin: string;
	secret: string;
}

/** Throws a ZodError for a row that no template knows. */
export function renderMail(house: MailHouse, row: { event: string; input: unknown }): Letter {
	const mail = StoredMail.parse(row);
	switch (mail.event) {
		case 'sign-in-link':
			return writeLetter(
				house.name,
				signInLink(house.origin, { token: linkToken(house.secret, mail.input.linkId) })
			);
		case 'query-raised':
			return writeLetter(house.name, queryRaised(house.origin, mail.input));
		case 'query-answered':
			return writeLetter(house.name, queryAnswered(house.origin, mail.input));
		case 'calculator-flagged':
			return writeLetter(house.name, calculatorFlagged(house.origin, mail.input));
	}
}
