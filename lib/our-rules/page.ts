import { type OurRules } from './rule';

/** The day's weather, the order of the walls, and what is drawn. */
export const pageRules = {
  'dry before': {
    text: 'A day without rain before the work, so that the wood is dry',
    because: 'The Wood Handbook asks for dry wood without a figure for rain; a day is what labels usually say, from memory.',
    where: ['lib/day/limits.ts'],
  },
  'dry after': {
    text: 'A day without rain after the work; within 4 hours fresh work is spoiled',
    because: 'Labels usually say from four hours to a day until a coat takes rain; from memory.',
    where: ['lib/day/limits.ts'],
  },
  'stain in heat': {
    text: 'Stain dries too fast to keep a wet edge above 90 °F (32 °C)',
    because: 'The Wood Handbook warns of hot surfaces without a figure; many labels stop at 90 °F, from memory.',
    where: ['lib/day/limits.ts'],
  },
  'oil at night': {
    text: 'The oil limit of 40 °F (4 °C), kept through the night as for waterborne finishes',
    because: 'The Wood Handbook gives the night’s limit for waterborne finishes only; oil cures slowly, so it is kept to its own.',
    where: ['lib/day/limits.ts'],
  },
  'caulk at night': {
    text: 'Fresh sealant is kept from frost for its first night',
    because: 'The published limit is for putting it on; water in fresh sealant that freezes breaks its skin.',
    where: ['lib/day/limits.ts'],
  },
  'dry joint': {
    text: 'The limit for finishing wood, below 20 %, taken for the wood beside a joint',
    because: 'Sealant sticks to dry wood; no limit was found for joints, so that of finishes stands in.',
    where: ['lib/day/limits.ts'],
  },
  'cool morning': {
    text: 'A morning up to 9 °F (5 °C) under the limit may still warm up to it: wait',
    because: 'A guess at what a clear forenoon gives; nothing published was found.',
    where: ['lib/day/limits.ts'],
  },
  'shade order': {
    text: 'The order in which work follows the shade: by the middle of each wall’s longest time out of the sun; trees count as shade when less than half of the light passes; stretches under ten minutes are left out',
    because: 'That one follows the shade is the Wood Handbook’s advice; the order is a simple way to do it.',
    where: ['lib/sun/shade-order.ts', 'lib/day/shade-words.ts'],
  },
  'about a day': {
    text: 'Days 1 to 10 of a month are called early, 11 to 20 mid, the rest late',
    because: 'Nobody coats a wall on a date; the exact day stands beside it.',
    where: ['lib/calendar-words.ts'],
  },
  'drawn house': {
    text: 'How walls are laid end to end on the house plan when measured widths leave a gap, where doors and windows are drawn on a wall, and the five equal steps of the sun dose from 250 to 1,350 kWh/m²',
    because: 'For drawing only; no figure depends on it.',
    where: ['lib/plan/outline.ts', 'lib/plan/elevation.ts', 'lib/plan/dose-class.ts', 'components/drawings/fade-time.ts'],
  },
  'plausible sizes': {
    text: 'Sizes of walls, eaves and porch roofs outside of plausible bounds are asked about',
    because: 'A slip of the finger is caught where it happens.',
    where: ['lib/schemas/wall.ts', 'lib/schemas/wall-cover.ts', 'lib/schemas/costs.ts'],
  },
} satisfies OurRules;
