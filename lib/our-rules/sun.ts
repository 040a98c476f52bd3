import { type OurRules } from './rule';

/** Sun, shade and the climate of a place. */
export const sunRules = {
  'sun hours': {
    text: 'Clouds do not count in the hours of direct sun: they count in the sun dose. Hours are those of the year 2026',
    because: 'Hours say where the sun can stand, whatever the weather; from one year to the next they differ by less than two hours.',
    where: ['lib/home/exposure.ts', 'lib/home/explained.ts'],
  },
  shade: {
    text: 'Shade from trees and buildings: what stands in front hides the sky 60 degrees to each side; leafy trees let 20 % of the light through in leaf and 65 % bare, evergreens 20 %, buildings none; one horizon stands for all heights of the wall',
    because: 'An owner can answer what stands there and how high; a crown lets about a fifth through in leaf and two thirds bare, from memory. A finer horizon would ask for a survey.',
    where: ['lib/home/shade.ts', 'lib/sun/sky-view.ts', 'lib/home/explained.ts'],
  },
  leaves: {
    text: 'Trees carry leaves in months with a mean of at least 50 °F (10 °C)',
    because: 'Broadleaved trees leaf out at about that mean, from memory; the calendar would be wrong in Florida and in Maine.',
    where: ['lib/sun/leaf-months.ts'],
  },
  cover: {
    text: 'A porch roof or a deck: opaque, level and endlessly long, throwing no shade beside itself; where the eave shades too, the deeper shade counts; light from the ground is as without it',
    because: 'The geometry of an overhang is exact for a long one. Light under its ends and shade beside it work against each other, and both are small on a wall as wide as a house.',
    where: ['lib/sun/strips.ts', 'lib/home/explained.ts'],
  },
  snow: {
    text: 'Snow on the ground: none in months with a mean of 32 °F (0 °C) or more, all of it at 21 °F (−6 °C) or less, in a straight line between; that bare ground reflects 20 % of the light and snow 60 % is from memory',
    because: 'Stations tell the temperature, not how much snow lies. Where the mean is 21 °F or less we take the ground to be white; a guess.',
    where: ['lib/climate/snow.ts', 'lib/home/explained.ts'],
  },
  station: {
    text: 'The climate of a home is that of the nearest station, a hundred meters of height counting as ten kilometers',
    because: '100 m of height make 0.65 °C, about what 70 to 100 km of latitude make; rain and fog change with height faster than with distance.',
    where: ['lib/climate/stations.ts', 'components/home/place-answer.tsx'],
  },
  'coating months': {
    text: 'A month is good for coating when its nights stay above the label’s limit and three dry days in a row have a chance of 15 %; marginal to 5 °C below it with warm days, or at 7 %; over 90 °F (32 °C) it carries a caution; where no month is good, the two that come nearest are offered with a warning',
    because: 'The limits of temperature are the Wood Handbook’s. It gives no figure for rain: wash, dry and coat take three dry days, and at one chance in seven a crew gets a few such spells in a month.',
    where: ['lib/climate/coating-season.ts'],
  },
} satisfies OurRules;
