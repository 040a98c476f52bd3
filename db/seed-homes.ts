import { type WalkaroundAnswers } from '../lib/home/walkaround';
import { type FilmState, type Membership, type Wood } from '../lib/schemas/vocabulary';
import { type WallChange } from './queries/walls';

/** The homes of the demo: invented people, sizes and histories at real postal codes in three climates. */

const ft = (feet: number) => feet * 0.3048;

/** Work of the past, so many years before the seed's day, on a day of that year. `walls` are positions. */
export type SeedWork = {
  kind: 'restain' | 'recaulk' | 'wash' | 'walkaround';
  yearsAgo: number;
  monthDay: string;
  walls: number[];
  product?: string;
  gallons?: number;
  dollars?: number;
  note?: string;
  /** How the coat or caulk that was renewed was found. */
  oldFilm?: FilmState;
  /** What a walkaround saw, by position of the wall. */
  seen?: Record<number, WalkaroundAnswers>;
  by: string;
};

export type SeedHome = {
  name: string;
  owner: string;
  members: { who: string; membership: Exclude<Membership, 'owner'> }[];
  postalCode: string;
  elevationM: number;
  compassDeg: number;
  wood: Wood;
  sidingNominalIn: number;
  yearBuilt: number;
  walls: WallChange[];
  work: SeedWork[];
};

type WallStart = Partial<WallChange> & { name: string; azimuthDeg: number; feet: [width: number, height: number] };

const wall = ({ feet: [width, height], ...rest }: WallStart): WallChange => ({
  widthM: ft(width),
  heightM: ft(height),
  gableHeightM: 0,
  eaveDepthM: ft(1.5),
  eaveDropM: 0,
  shade: 'open',
  shadeHeightDeg: 0,
  weatherSide: false,
  finish: 'semitransparent',
  stainBase: 'oil',
  colorHex: '#8A5A32',
  colorName: 'Walnut shell',
  texture: 'saw-textured',
  sealant: 'acrylic-latex',
  openings: [],
  stained: null,
  caulked: null,
  ...rest,
});

const windows = (count: number, width = 3, height = 4) => ({ kind: 'window' as const, widthM: ft(width), heightM: ft(height), count });
const door = (width = 3) => ({ kind: 'door' as const, widthM: ft(width), heightM: ft(6.8), count: 1 });

const larchRidge: SeedHome = {
  name: 'Larch Ridge',
  owner: 'marit',
  members: [{ who: 'harlan', membership: 'contractor' }],
  postalCode: '59715',
  elevationM: 1520,
  compassDeg: 200,
  wood: 'pine-fir-spruce',
  sidingNominalIn: 8,
  yearBuilt: 2009,
  walls: [
    wall({ name: 'Front', azimuthDeg: 200, feet: [42, 9], gableHeightM: ft(8), eaveDepthM: ft(1), openings: [windows(4), door()] }),
    wall({ name: 'West end', azimuthDeg: 290, feet: [28, 9], weatherSide: true, eaveDepthM: ft(2), openings: [windows(2)] }),
    wall({ name: 'Back', azimuthDeg: 20, feet: [42, 9], shade: 'evergreens', shadeHeightDeg: 35, pipes: 6, openings: [windows(3), door()] }),
    wall({ name: 'East porch', azimuthDeg: 110, feet: [28, 9], cover: 'porch', coverDepthM: ft(8), coverHeightM: ft(8.5), coverShare: 0.75, pipes: 3, openings: [windows(2), door(6)] }),
  ],
  work: [
    { kind: 'restain', yearsAgo: 9, monthDay: '07-12', walls: [0, 1, 2, 3], product: 'Oil semitransparent, walnut shell', gallons: 16, dollars: 5200, by: 'harlan' },
    { kind: 'recaulk', yearsAgo: 9, monthDay: '07-08', walls: [0, 1, 2, 3], product: 'Acrylic latex, brown', by: 'harlan' },
    { kind: 'restain', yearsAgo: 5, monthDay: '06-24', walls: [0], product: 'Oil semitransparent, walnut shell', gallons: 6, dollars: 1650, note: 'Gray above the windows before washing.', oldFilm: 'past due', by: 'marit' },
    { kind: 'restain', yearsAgo: 3, monthDay: '08-30', walls: [1], product: 'Oil semitransparent, walnut shell', gallons: 4, dollars: 980, oldFilm: 'due', by: 'harlan' },
    { kind: 'recaulk', yearsAgo: 3, monthDay: '08-27', walls: [1], product: 'Acrylic latex, brown', by: 'harlan' },
    { kind: 'wash', yearsAgo: 1, monthDay: '05-18', walls: [0, 1, 2, 3], by: 'marit' },
    {
      kind: 'walkaround',
      yearsAgo: 1,
      monthDay: '10-04',
      walls: [0, 1, 2, 3],
      note: 'South gable dries dark within a minute of hosing.',
      seen: {
        0: { water: 'beads', color: 'holds', caulk: 'holds', also: ['checks'] },
        1: { water: 'beads', color: 'holds', caulk: 'holds', also: [] },
        2: { water: 'beads', color: 'holds', caulk: 'parts', also: ['mildew'] },
        3: { water: 'beads', color: 'holds', caulk: 'holds', also: [] },
      },
      by: 'marit',
    },
  ],
};

const laurelCabin: SeedHome = {
  name: 'Laurel Cabin (rental)',
  owner: 'marit',
  members: [
    { who: 'june', membership: 'caretaker' },
    { who: 'odile', membership: 'contractor' },
  ],
  postalCode: '28711',
  elevationM: 730,
  compassDeg: 135,
  wood: 'cedar-redwood',
  sidingNominalIn: 6,
  yearBuilt: 1974,
  walls: [
    wall({ name: 'Creek side', azimuthDeg: 135, feet: [30, 8.5], eaveDepthM: ft(6), eaveDropM: ft(0.5), finish: 'tinted-clear', colorHex: '#B9803F', colorName: 'Honey pine', openings: [windows(3), door()] }),
    wall({ name: 'Drive side', azimuthDeg: 225, feet: [24, 8.5], gableHeightM: ft(7), eaveDepthM: ft(0), weatherSide: true, finish: 'tinted-clear', colorHex: '#B9803F', colorName: 'Honey pine', openings: [windows(2)] }),
    wall({ name: 'Bank side', azimuthDeg: 315, feet: [30, 8.5], shade: 'building', shadeHeightDeg: 25, finish: 'tinted-clear', colorHex: '#B9803F', colorName: 'Honey pine', openings: [windows(1)] }),
    wall({ name: 'Garden side', azimuthDeg: 45, feet: [24, 8.5], gableHeightM: ft(7), shade: 'trees', shadeHeightDeg: 45, finish: 'tinted-clear', colorHex: '#B9803F', colorName: 'Honey pine', openings: [windows(2)] }),
  ],
  work: [
    { kind: 'restain', yearsAgo: 4, monthDay: '05-06', walls: [0, 1, 2, 3], product: 'Tinted clear, honey pine', gallons: 9, dollars: 3100, by: 'odile' },
    { kind: 'restain', yearsAgo: 2, monthDay: '05-14', walls: [0, 1], product: 'Tinted clear, honey pine', gallons: 5, dollars: 1480, oldFilm: 'past due', by: 'odile' },
    { kind: 'recaulk', yearsAgo: 6, monthDay: '09-20', walls: [0, 1, 2, 3], product: 'Acrylic latex, clear', by: 'odile' },
    { kind: 'wash', yearsAgo: 1, monthDay: '04-22', walls: [0, 1, 2, 3], note: 'Mildew on the bank side.', by: 'june' },
  ],
};

const agatePoint: SeedHome = {
  name: 'Agate Point',
  owner: 'tobias',
  members: [],
  postalCode: '55804',
  elevationM: 200,
  compassDeg: 150,
  wood: 'other',
  sidingNominalIn: 10,
  yearBuilt: 1998,
  walls: [
    wall({ name: 'Lake side', azimuthDeg: 150, feet: [36, 10], gableHeightM: ft(9), eaveDepthM: ft(1), cover: 'deck', coverDepthM: ft(10), coverHeightM: ft(8), coverShare: 0.5, corners: 1, pipes: 2, weatherSide: true, finish: 'solid-color', stainBase: 'waterborne', colorHex: '#5B4A3A', colorName: 'Bark', openings: [windows(5, 4, 5), door(6)] }),
    wall({ name: 'Garage end', azimuthDeg: 240, feet: [26, 10], corners: 1, pipes: 4, finish: 'solid-color', stainBase: 'waterborne', colorHex: '#5B4A3A', colorName: 'Bark', openings: [{ kind: 'door', widthM: ft(9), heightM: ft(7), count: 1 }] }),
    wall({ name: 'Road side', azimuthDeg: 330, feet: [36, 10], gableHeightM: ft(9), shade: 'evergreens', shadeHeightDeg: 30, openings: [windows(3), door()] }),
    wall({ name: 'Wood-shed side', azimuthDeg: 60, feet: [26, 10], shade: 'trees', shadeHeightDeg: 30, openings: [windows(1)] }),
  ],
  work: [
    { kind: 'restain', yearsAgo: 7, monthDay: '07-02', walls: [0, 1], product: 'Solid-color acrylic, bark', gallons: 8, by: 'tobias' },
    { kind: 'recaulk', yearsAgo: 7, monthDay: '06-28', walls: [0], product: 'Polyurethane', by: 'tobias' },
    { kind: 'walkaround', yearsAgo: 0, monthDay: '10-11', walls: [2], note: 'The stain was there when we bought the house.', seen: { 2: { water: 'beads', color: 'holds', caulk: 'holds', also: ['splash'] } }, by: 'tobias' },
  ],
};

const bunkhouse: SeedHome = {
  name: 'Pruitt bunkhouse',
  owner: 'wendell',
  members: [{ who: 'harlan', membership: 'contractor' }],
  postalCode: '59047',
  elevationM: 1370,
  compassDeg: 180,
  wood: 'pine-fir-spruce',
  sidingNominalIn: 8,
  yearBuilt: 1969,
  walls: [
    wall({ name: 'South', azimuthDeg: 180, feet: [32, 8], eaveDepthM: ft(0.5), texture: 'smooth', openings: [windows(3), door()] }),
    wall({ name: 'West', azimuthDeg: 270, feet: [20, 8], gableHeightM: ft(6), eaveDepthM: ft(0.5), weatherSide: true, texture: 'smooth', openings: [windows(1)] }),
    wall({ name: 'North', azimuthDeg: 0, feet: [32, 8], eaveDepthM: ft(0.5), texture: 'smooth', openings: [windows(2)] }),
    wall({ name: 'East', azimuthDeg: 90, feet: [20, 8], gableHeightM: ft(6), eaveDepthM: ft(0.5), texture: 'smooth', openings: [windows(1), door()] }),
  ],
  work: [
    { kind: 'restain', yearsAgo: 4, monthDay: '09-02', walls: [0, 1, 2, 3], product: 'Oil semitransparent', gallons: 7, dollars: 900, note: 'One coat, brushed.', by: 'wendell' },
    { kind: 'recaulk', yearsAgo: 2, monthDay: '06-15', walls: [1], by: 'wendell' },
  ],
};

export const demoHomes: SeedHome[] = [larchRidge, laurelCabin, agatePoint, bunkhouse];
