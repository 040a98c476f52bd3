import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id } from './columns';
import { home } from './homes';
import { user } from './people';

/** Who changed what, and when. Rows are only added. */
export const auditEvent = sqliteTable(
  'audit_event',
  {
    id: id(),
    /** Null when the person is gone, or a job did it. */
    actorId: text('actor_id').references(() => user.id, { onDelete: 'set null' }),
    /** How it came: signed in, by a mailed link, or by a job. */
    via: text('via', { enum: ['session', 'link', 'job'] }).notNull(),
    homeId: text('home_id').references(() => home.id, { onDelete: 'cascade' }),
    /** What was done, in a word or two: 'wall changed', 'work logged'. */
    event: text('event').notNull(),
    /** To what: the id of the wall, record or person. */
    subjectId: text('subject_id'),
    /** What differs, by field: before and after. No secrets, no notes. */
    detail: text('detail', { mode: 'json' }).$type<Record<string, unknown>>(),
    createdAt: createdAt(),
  },
  (t) => [index('audit_home').on(t.homeId, t.createdAt), index('audit_actor').on(t.actorId)],
);
