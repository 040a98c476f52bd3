/** The closed lists of the trade that forms, database and computation share. Labels are what a screen says. */

export const finishes = {
  'water-repellent': 'Clear water repellent',
  'tinted-clear': 'Tinted clear finish',
  semitransparent: 'Semitransparent stain',
  'solid-color': 'Solid-color stain',
} as const;
export type Finish = keyof typeof finishes;

export const textures = { smooth: 'Smooth', 'saw-textured': 'Saw-textured or weathered' } as const;
export type Texture = keyof typeof textures;

export const woods = {
  'cedar-redwood': 'Cedar or redwood',
  'pine-fir-spruce': 'Pine, fir or spruce',
  other: 'Another wood or not known',
} as const;
export type Wood = keyof typeof woods;

export const sealants = {
  'acrylic-latex': 'Acrylic latex',
  polyurethane: 'Polyurethane',
  silicone: 'Silicone',
} as const;
export type Sealant = keyof typeof sealants;

export const workKinds = { restain: 'Restain', recaulk: 'Recaulk', wash: 'Wash', walkaround: 'Walkaround' } as const;
export type WorkKind = keyof typeof workKinds;

export const stainBases = { oil: 'Oil or alkyd', waterborne: 'Waterborne (latex or acrylic)' } as const;
export type StainBase = keyof typeof stainBases;

export const shades = {
  open: 'Open sky',
  trees: 'Leafy trees in front',
  evergreens: 'Evergreens in front',
  building: 'A building or hill in front',
} as const;
export type Shade = keyof typeof shades;

/** A roof against the wall, lower than its eave or deeper, that keeps sun and rain off the wall under it. */
export const covers = { none: 'Nothing', porch: 'A porch roof', deck: 'A deck above' } as const;
export type Cover = keyof typeof covers;

/** How a coat or the caulk was found: still doing its work, ready to be renewed, or past that. */
export const filmStates = { sound: 'Sound', due: 'Due', 'past due': 'Past due' } as const;
export type FilmState = keyof typeof filmStates;

/** Who does the work; it decides what a trip and a coat cost. */
export const doers = { self: 'I do it myself', hired: 'A contractor does it' } as const;
export type Doer = keyof typeof doers;

export const roles = { homeowner: 'Homeowner', contractor: 'Contractor', operator: 'Operator' } as const;
export type Role = keyof typeof roles;

/** What a person may be to one home. */
export const memberships = {
  owner: 'Owner',
  'co-owner': 'Co-owner',
  caretaker: 'Caretaker',
  contractor: 'Contractor',
} as const;
export type Membership = keyof typeof memberships;

export const unitSystems = { us: 'US customary', metric: 'Metric' } as const;
export type UnitSystem = keyof typeof unitSystems;

/** Zones of the US energy code (IECC), with their moisture letter. */
export const climateZones = ['1A', '2A', '2B', '3A', '3B', '3C', '4A', '4B', '4C', '5A', '5B', '5C', '6A', '6B', '7', '7A', '7B', '8'] as const;

/** Keys of a record as the non-empty tuple that z.enum and drizzle want. */
export const keysOf = <K extends string>(record: Record<K, unknown>) => Object.keys(record) as [K, ...K[]];
