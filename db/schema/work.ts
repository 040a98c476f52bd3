import { sql } from 'drizzle-orm';
import { check, index, integer, primaryKey, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { type FilmLife, type WorkItem } from '../../lib/care/types';
import { type Explanation } from '../../lib/explain';
import { type WalkaroundAnswers } from '../../lib/home/walkaround';
import { doers, filmStates, finishes, keysOf, sealants, stainBases, workKinds } from '../../lib/schemas/vocabulary';
import { createdAt, id, instant } from './columns';
import { home, wall } from './homes';
import { user } from './people';

/** Work that was done: logged by somebody, or recalled when the home was set up. */
export const workRecord = sqliteTable(
  'work_record',
  {
    id: id(),
    homeId: text('home_id').notNull().references(() => home.id, { onDelete: 'cascade' }),
    kind: text('kind', { enum: keysOf(workKinds) }).notNull(),
    doneOn: text('done_on').notNull(),
    origin: text('origin', { enum: ['logged', 'recalled'] }).notNull(),
    product: text('product'),
    amountL: real('amount_l'),
    costCents: integer('cost_cents'),
    note: text('note'),
    finish: text('finish', { enum: keysOf(finishes) }),
    stainBase: text('stain_base', { enum: keysOf(stainBases) }),
    colorHex: text('color_hex'),
    sealant: text('sealant', { enum: keysOf(sealants) }),
    /** Sent by the form; the same submission arriving twice makes one record. */
    submissionKey: text('submission_key').notNull().unique(),
    createdBy: text('created_by').references(() => user.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    removedAt: instant('removed_at'),
    removedBy: text('removed_by').references(() => user.id, { onDelete: 'set null' }),
  },
  (t) => [
    index('work_record_home').on(t.homeId, t.doneOn),
    check('work_record_day', sql`${t.doneOn} glob '[12][0-9][0-9][0-9]-[01][0-9]-[0-3][0-9]'`),
    check('work_record_amounts', sql`(${t.amountL} is null or ${t.amountL} >= 0) and (${t.costCents} is null or ${t.costCents} >= 0)`),
  ],
);

export const workRecordWall = sqliteTable(
  'work_record_wall',
  {
    workRecordId: text('work_record_id').notNull().references(() => workRecord.id, { onDelete: 'cascade' }),
    wallId: text('wall_id').notNull().references(() => wall.id, { onDelete: 'cascade' }),
  },
  (t) => [primaryKey({ columns: [t.workRecordId, t.wallId] }), index('work_record_wall_wall').on(t.wallId)],
);

/** An owner's own rule for one kind of work on one wall, in place of the computed one. */
export const careRule = sqliteTable(
  'care_rule',
  {
    wallId: text('wall_id').notNull().references(() => wall.id, { onDelete: 'cascade' }),
    kind: text('kind', { enum: keysOf(workKinds) }).notNull(),
    rule: text('rule').notNull(),
    startOn: text('start_on').notNull(),
    createdBy: text('created_by').references(() => user.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
  },
  (t) => [primaryKey({ columns: [t.wallId, t.kind] })],
);

/** Coat and seal life of a wall as last planned. */
export const wallPlan = sqliteTable('wall_plan', {
  wallId: text('wall_id').primaryKey().references(() => wall.id, { onDelete: 'cascade' }),
  coat: text('coat', { mode: 'json' }).$type<FilmLife>().notNull(),
  seal: text('seal', { mode: 'json' }).$type<FilmLife>().notNull(),
});

/** The next work of each kind on each wall as last planned. Dates are calendar days at the home. */
export const workItem = sqliteTable(
  'work_item',
  {
    wallId: text('wall_id').notNull().references(() => wall.id, { onDelete: 'cascade' }),
    kind: text('kind', { enum: keysOf(workKinds) }).notNull(),
    homeId: text('home_id').notNull().references(() => home.id, { onDelete: 'cascade' }),
    rule: text('rule'),
    startOn: text('start_on'),
    dueOn: text('due_on').notNull(),
    opensOn: text('opens_on').notNull(),
    closesOn: text('closes_on').notNull(),
    moved: text('moved').$type<WorkItem['window']['moved']>().notNull(),
    missedOn: text('missed_on'),
    lapsesOn: text('lapses_on'),
    /** The day on which the next reminder stage begins; null when none is left. Written at planning and after each run. */
    remindOn: text('remind_on'),
    basis: text('basis').$type<WorkItem['basis']>().notNull(),
    lifeMonths: integer('life_months'),
    because: text('because').notNull(),
    explanation: text('explanation', { mode: 'json' }).$type<Explanation>().notNull(),
  },
  (t) => [primaryKey({ columns: [t.wallId, t.kind] }), index('work_item_home').on(t.homeId), index('work_item_opens').on(t.opensOn), index('work_item_remind').on(t.remindOn)],
);

/** How the films of a wall were found: on a walkaround, or when the old coat or caulk was renewed. */
export const finding = sqliteTable(
  'finding',
  {
    id: id(),
    workRecordId: text('work_record_id').notNull().references(() => workRecord.id, { onDelete: 'cascade' }),
    wallId: text('wall_id').notNull().references(() => wall.id, { onDelete: 'cascade' }),
    coat: text('coat', { enum: keysOf(filmStates) }),
    seal: text('seal', { enum: keysOf(filmStates) }),
    /** What was seen, as answered; null where only the state was said. */
    answers: text('answers', { mode: 'json' }).$type<WalkaroundAnswers>(),
  },
  (t) => [uniqueIndex('finding_once').on(t.workRecordId, t.wallId), index('finding_wall').on(t.wallId)],
);

/** Work that somebody put off: not before a day. Taken back, it keeps who and when. */
export const deferral = sqliteTable(
  'deferral',
  {
    id: id(),
    homeId: text('home_id').notNull().references(() => home.id, { onDelete: 'cascade' }),
    wallId: text('wall_id').notNull().references(() => wall.id, { onDelete: 'cascade' }),
    kind: text('kind', { enum: keysOf(workKinds) }).notNull(),
    /** Which piece of work: `workKey` of lib/care/work-key.ts. */
    workKey: text('work_key').notNull(),
    /** The opening day of the window that was passed up, and the day before which it is not asked for again. */
    fromOpensOn: text('from_opens_on').notNull(),
    notBefore: text('not_before').notNull(),
    createdBy: text('created_by').references(() => user.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    withdrawnAt: instant('withdrawn_at'),
    withdrawnBy: text('withdrawn_by').references(() => user.id, { onDelete: 'set null' }),
  },
  (t) => [index('deferral_home').on(t.homeId), uniqueIndex('deferral_once').on(t.workKey, t.fromOpensOn).where(sql`withdrawn_at is null`)],
);

/** What work costs at one home, as its owner says; without a row the example prices stand in. Cents. */
export const homeCost = sqliteTable(
  'home_cost',
  {
    homeId: text('home_id').primaryKey().references(() => home.id, { onDelete: 'cascade' }),
    doer: text('doer', { enum: keysOf(doers) }).notNull(),
    tripCents: integer('trip_cents').notNull(),
    restainCentsPerM2: real('restain_cents_per_m2').notNull(),
    stripCentsPerM2: real('strip_cents_per_m2').notNull(),
    recaulkCentsPerM: real('recaulk_cents_per_m').notNull(),
    washCentsPerM2: real('wash_cents_per_m2').notNull(),
    setBy: text('set_by').references(() => user.id, { onDelete: 'set null' }),
    setAt: instant('set_at').notNull(),
  },
  (t) => [check('home_cost_amounts', sql`${t.tripCents} >= 0 and ${t.restainCentsPerM2} >= 0 and ${t.stripCentsPerM2} >= 0 and ${t.recaulkCentsPerM} >= 0 and ${t.washCentsPerM2} >= 0`)],
);
