import { sql } from 'drizzle-orm';
import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { keysOf, workKinds } from '../../lib/schemas/vocabulary';
import { createdAt, id, instant } from './columns';
import { home, wall } from './homes';
import { user } from './people';

/** The outbox: one row is one e-mail to one address. */
export const mail = sqliteTable(
  'mail',
  {
    id: id(),
    /** A name in the mail registry (lib/mail). */
    kind: text('kind').notNull(),
    /** Two requests with the same key are one mail. */
    idempotencyKey: text('idempotency_key').notNull().unique(),
    toAddress: text('to_address').notNull(),
    userId: text('user_id').references(() => user.id, { onDelete: 'cascade' }),
    homeId: text('home_id').references(() => home.id, { onDelete: 'cascade' }),
    /** What the mail is written from; emptied after sending when it holds a secret link. */
    props: text('props', { mode: 'json' }).$type<Record<string, unknown>>().notNull(),
    messageId: text('message_id').notNull().unique(),
    subject: text('subject'),
    state: text('state', { enum: ['queued', 'sending', 'sent', 'refused', 'cancelled'] }).notNull().default('queued'),
    attempts: integer('attempts').notNull().default(0),
    nextAttemptAt: instant('next_attempt_at').notNull(),
    leaseToken: text('lease_token'),
    leaseUntil: instant('lease_until'),
    sentAt: instant('sent_at'),
    lastError: text('last_error'),
    createdAt: createdAt(),
  },
  (t) => [index('mail_open').on(t.nextAttemptAt).where(sql`state in ('queued', 'sending')`), index('mail_created').on(t.createdAt)],
);

/** One stage of one piece of work that one person has been (or is being) reminded of. */
export const delivery = sqliteTable(
  'delivery',
  {
    id: id(),
    key: text('key').notNull().unique(),
    homeId: text('home_id').notNull().references(() => home.id, { onDelete: 'cascade' }),
    userId: text('user_id').notNull().references(() => user.id, { onDelete: 'cascade' }),
    wallId: text('wall_id').notNull().references(() => wall.id, { onDelete: 'cascade' }),
    kind: text('kind', { enum: keysOf(workKinds) }).notNull(),
    stage: text('stage').notNull(),
    /** Which piece of work, whatever becomes of its date (lib/care/stages). */
    workKey: text('work_key').notNull(),
    dueOn: text('due_on').notNull(),
    mailId: text('mail_id').notNull().references(() => mail.id, { onDelete: 'cascade' }),
    createdAt: createdAt(),
  },
  (t) => [index('delivery_mail').on(t.mailId), index('delivery_home').on(t.homeId)],
);

export const jobRun = sqliteTable(
  'job_run',
  {
    id: id(),
    job: text('job').notNull(),
    startedAt: instant('started_at').notNull(),
    finishedAt: instant('finished_at'),
    outcome: text('outcome', { mode: 'json' }).$type<Record<string, number>>(),
    error: text('error'),
  },
  (t) => [index('job_run_started').on(t.startedAt)],
);

/** A piece of work that a person wants no more reminders of; taken back, it keeps when. */
export const reminderStop = sqliteTable(
  'reminder_stop',
  {
    id: id(),
    userId: text('user_id').notNull().references(() => user.id, { onDelete: 'cascade' }),
    homeId: text('home_id').notNull().references(() => home.id, { onDelete: 'cascade' }),
    wallId: text('wall_id').notNull().references(() => wall.id, { onDelete: 'cascade' }),
    kind: text('kind', { enum: keysOf(workKinds) }).notNull(),
    /** Which piece of work: `workKey` of lib/care/work-key.ts. */
    workKey: text('work_key').notNull(),
    createdAt: createdAt(),
    withdrawnAt: instant('withdrawn_at'),
  },
  (t) => [uniqueIndex('reminder_stop_once').on(t.userId, t.workKey).where(sql`withdrawn_at is null`), index('reminder_stop_home').on(t.homeId)],
);

/** What a mail server said after it had taken a mail: it came back, for good or for now. */
export const bounce = sqliteTable(
  'bounce',
  {
    id: id(),
    mailId: text('mail_id').references(() => mail.id, { onDelete: 'cascade' }),
    address: text('address').notNull(),
    isPermanent: integer('is_permanent', { mode: 'boolean' }).notNull(),
    /** Enhanced status code of RFC 3463, like 5.1.1, if one was given. */
    status: text('status'),
    detail: text('detail'),
    /** The same report arriving twice is one. */
    reportKey: text('report_key').notNull().unique(),
    createdAt: createdAt(),
  },
  (t) => [index('bounce_mail').on(t.mailId), index('bounce_address').on(t.address)],
);
