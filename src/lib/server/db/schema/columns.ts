import { text, timestamp } from 'drizzle-orm/pg-core';
import { newId } from '../ids.ts';

/** Columns that every table spells the same way. */
export const id = () => text().primaryKey().$defaultFn(newId);
export const moment = () => timestamp({ withTimezone: true, mode: 'date' });
