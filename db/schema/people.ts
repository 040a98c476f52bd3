import { type AdapterAccountType } from './adapter-account';
import { index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { keysOf, roles, unitSystems } from '../../lib/schemas/vocabulary';
import { createdAt, id, instant } from './columns';

export const user = sqliteTable('user', {
  id: id(),
  name: text('name'),
  /** Lower case, trimmed. */
  email: text('email').notNull().unique(),
  emailVerified: instant('email_verified'),
  image: text('image'),
  passwordHash: text('password_hash'),
  role: text('role', { enum: keysOf(roles) }).notNull().default('homeowner'),
  company: text('company'),
  units: text('units', { enum: keysOf(unitSystems) }).notNull().default('us'),
  remindersOn: integer('reminders_on', { mode: 'boolean' }).notNull().default(true),
  /** Since when mail to this address comes back for good; nothing more is sent to it until somebody lifts that. */
  bouncedAt: instant('bounced_at'),
  /** Sessions issued before this instant no longer count (password changed). */
  sessionsValidFrom: instant('sessions_valid_from'),
  createdAt: createdAt(),
});

/** Tables that the next-auth adapter asks for. */
export const account = sqliteTable(
  'account',
  {
    userId: text('user_id').notNull().references(() => user.id, { onDelete: 'cascade' }),
    type: text('type').$type<AdapterAccountType>().notNull(),
    provider: text('provider').notNull(),
    providerAccountId: text('provider_account_id').notNull(),
    refresh_token: text('refresh_token'),
    access_token: text('access_token'),
    expires_at: integer('expires_at'),
    token_type: text('token_type'),
    scope: text('scope'),
    id_token: text('id_token'),
    session_state: text('session_state'),
  },
  (t) => [primaryKey({ columns: [t.provider, t.providerAccountId] })],
);

export const session = sqliteTable('session', {
  sessionToken: text('session_token').primaryKey(),
  userId: text('user_id').notNull().references(() => user.id, { onDelete: 'cascade' }),
  expires: instant('expires').notNull(),
});

export const verificationToken = sqliteTable(
  'verification_token',
  {
    identifier: text('identifier').notNull(),
    token: text('token').notNull(),
    expires: instant('expires').notNull(),
  },
  (t) => [primaryKey({ columns: [t.identifier, t.token] })],
);

/** One-use links for verifying an address and setting a new password; only the hash is kept. */
export const accountToken = sqliteTable(
  'account_token',
  {
    tokenHash: text('token_hash').primaryKey(),
    userId: text('user_id').notNull().references(() => user.id, { onDelete: 'cascade' }),
    purpose: text('purpose', { enum: ['verify', 'reset'] }).notNull(),
    expiresAt: instant('expires_at').notNull(),
    usedAt: instant('used_at'),
    createdAt: createdAt(),
  },
  (t) => [index('account_token_user').on(t.userId)],
);
