import { integer, text } from 'drizzle-orm/sqlite-core';

export const id = () => text('id').primaryKey().$defaultFn(() => crypto.randomUUID());
/** An instant, stored as milliseconds since 1970 UTC. */
export const instant = (name: string) => integer(name, { mode: 'timestamp_ms' });
export const createdAt = () => instant('created_at').notNull().$defaultFn(() => new Date());
