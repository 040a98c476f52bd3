import { type OurRules } from './rule';

/** How long coats and caulk last, and what a wall's own history teaches. */
export const filmRules = {
  severity: {
    text: 'Where on the published range a wall falls: sun share (dose − 250) / 1100 kWh/m², rain share Scheffer / 100 × exposure; sun counts 0.70 for clear and tinted, 0.65 for semitransparent, 0.5 for solid color, 0.6 for caulk',
    because: 'The ranges are published, the place within them is not. 250 to 1,350 kWh/m² is about what walls get in the 48 states; sun breaks down what pigment does not shield, so it counts less the more pigment there is.',
    where: ['lib/coat/severity.ts', 'lib/coat/coat-life.ts', 'lib/coat/seal-life.ts', 'lib/coat/life.ts'],
  },
  'rain under an eave': {
    text: 'Under a porch roof or a deck rain is kept off as under an eave of its depth; what is under it counts by its area. An eave half as deep as the wall is high leaves three tenths of the rain; a weather side takes a fifth more',
    because: 'Driving rain reaches the lower courses under any eave. How much is kept off differs widely with wind; these are round guesses, no source.',
    where: ['lib/coat/severity.ts'],
  },
  'unknown wood': {
    text: 'A wood that is not known counts as the shorter-lived of the published ones',
    because: 'Recoating late costs more than recoating early.',
    where: ['lib/coat/service-life.ts', 'lib/coat/coat-life.ts'],
  },
  learning: {
    text: 'The wall’s own factor: a normal-normal update of its logarithm, from 1 with a deviation of 0.25, by each earlier film that was looked at; within 0.5 to 2. Due counts at its age with 0.15, past due at 0.85 and sound beyond its time at 1.15 of it with 0.25',
    because: 'That walls stray from the model by about a quarter is a guess until enough of them have been seen. One look says more when the coat is just due than when it is long past or still sound; a coat that was seen often still teaches once.',
    where: ['lib/coat/learning.ts', 'lib/care/learned-words.ts', 'components/home/learned-course.tsx'],
  },
  'assumed age': {
    text: 'Age of a film that nobody knows, from how it was found: due, its whole life; past due, more; sound, half of it',
    because: 'A made-up date would be worse than a reckoned one that says so. Half is the middle of what a sound coat can be.',
    where: ['lib/care/film-spans.ts', 'lib/care/learned-words.ts'],
  },
  'even wear': {
    text: 'A film wears evenly over its life',
    because: 'How a coat fades over time was published for single products only; an even share is what people understand.',
    where: ['lib/home/explained.ts'],
  },
  'seen on a walk': {
    text: 'Water that soaks in or wood that shows means due; gray wood or a peeling coat means past due; caulk that let go in places is due, widely is past due',
    because: 'The Wood Handbook says to refinish when wood begins to show, before all pigment is lost; the water test is common practice. The worst sign counts.',
    where: ['lib/home/walkaround.ts'],
  },
  stripping: {
    text: 'A coat older than 1.15 times its life is stripped before it is renewed, which costs several times a maintenance coat',
    because: 'That a coat left too long has to be stripped is common practice; the number is ours, the same by which a sound coat may outlive its time.',
    where: ['lib/care/stripping.ts', 'lib/care/trip-rules.ts', 'lib/care/deferral-choices.ts'],
  },
  'one change': {
    text: 'A change to a wall is judged one at a time, an eave 1 or 2 ft (30 or 60 cm) deeper; the wall’s own factor stays, a restain costs the same whatever the finish, and what the change itself costs is not counted',
    because: 'Carpentry, stripping and a change of finish are priced by whoever does them; only what follows from the wall can be reckoned here.',
    where: ['lib/home/what-if.ts', 'lib/home/what-if-words.ts'],
  },
} satisfies OurRules;
