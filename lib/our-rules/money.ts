import { type OurRules } from './rule';

/** Trips, prices, and how much to buy. */
export const moneyRules = {
  join: {
    text: 'A wall due within so many months of a trip joins it when the share of film life thrown away costs less than another trip; the months, 0 to 24, are those that cost least a year over 20 years',
    because: 'It weighs what is thrown away against what is saved, in the home’s own prices; twenty years hold three or four coats.',
    where: ['lib/care/trip-rules.ts', 'lib/care/choose-grouping.ts'],
  },
  'trip day': {
    text: 'A trip is reckoned to take place on the day on which its first film is used up, or on the nearest day that suits all of its work',
    because: 'A definite day is needed to reckon; any other in the window shifts all years alike.',
    where: ['lib/care/trip-rules.ts', 'lib/care/with-restain.ts'],
  },
  'worth left': {
    text: 'Choices are compared over 20 years, less the share of film life that is left at the end, at the price of its renewal',
    because: 'Without it, a choice that happens to end on fresh coats would look dear.',
    where: ['lib/home/budget-explained.ts'],
  },
  'wash in the budget': {
    text: 'A wall that is restained in a year is washed with it; every other wall is washed by its care rule',
    because: 'The price of a restain includes its wash.',
    where: ['lib/care/budget.ts', 'lib/home/budget-explained.ts'],
  },
  prices: {
    text: 'Prices as the owner gave them, or our examples until then; without any rise of prices',
    because: 'We know no survey of such prices; the examples are invented, in the relations that the trade knows, for the owner to replace.',
    where: ['lib/home/budget-explained.ts', 'lib/care/budget.ts', 'lib/schemas/costs.ts'],
  },
  'example prices': {
    text: 'Example prices, invented by us: nobody has set what work costs at this home',
    because: 'A figure that can be replaced is of more use than none; it says that it is an example.',
    where: ['lib/home/what-if-words.ts'],
  },
  'shop prices': {
    text: 'Prices as typed; those that the form starts with are our examples',
    because: 'Shops differ; the cheapest mix is exact for whatever prices are typed.',
    where: ['lib/takeoff/explained.ts', 'lib/takeoff/sealant-explained.ts'],
  },
  'thirsty end': {
    text: 'Buying for the thirsty end of the range, and the share of waste: a tenth unless you say otherwise',
    because: 'A can too few stops the work on a wet edge; a can too many is returned.',
    where: ['lib/takeoff/explained.ts', 'lib/jobs/work-ahead.ts', 'lib/jobs/caulk-for-home.ts'],
  },
  'every mix': {
    text: 'Every mix of containers is weighed, to the fluid ounce; caulk to a tenth of one',
    because: 'The cheapest is found, not guessed at; sizes that share no unit are rounded down, so that the mix always holds the need.',
    where: ['lib/takeoff/explained.ts', 'lib/takeoff/sealant-explained.ts'],
  },
  joints: {
    text: 'Joints: boards of up to 16 ft, two log-end corners a wall unless you say otherwise, each shared by two walls, a foot of joint around each pipe, joints of 1/4 in; in a gable a course counts as half the wall’s width; sizes beyond 1 in are left to the maker',
    because: 'What is caulked is common practice; how many joints there are follows from the usual length of boards.',
    where: ['lib/takeoff/joints.ts', 'lib/takeoff/sealant-need.ts', 'lib/takeoff/joint-size.ts', 'lib/home/wall-joints.ts', 'lib/jobs/caulk-for-home.ts'],
  },
  'deeper bead': {
    text: 'Buying for the deeper bead where two handbooks differ, and the share of waste',
    because: 'Between two published depths the larger one is never short.',
    where: ['lib/takeoff/sealant-explained.ts'],
  },
  label: {
    text: 'The label of the product wins',
    because: 'Its maker tested it; a table stands for products in general.',
    where: ['lib/takeoff/sealant-explained.ts'],
  },
  rod: {
    text: 'Rod for every joint: the most it can take; a joint too shallow for rod takes bond-breaker tape',
    because: 'Which joints are deep enough is seen at the wall only; rod left over keeps.',
    where: ['lib/takeoff/sealant-explained.ts'],
  },
  cleaner: {
    text: 'Four parts of water to one of concentrate, unless you gave the label’s; buying for the thirsty end',
    because: 'Labels of wood cleaners differ; four to one is a strong usual mix.',
    where: ['lib/takeoff/cleaner.ts'],
  },
} satisfies OurRules;
