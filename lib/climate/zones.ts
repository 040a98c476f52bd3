import { countiesByZone } from './data/zones';

/** Where a county's zone comes from. */
export type ZoneGround = 'published' | 'memory';

const zoneByCounty = new Map(Object.entries(countiesByZone).flatMap(([zone, counties]) => counties.split(' ').map((fips) => [fips, zone] as const)));

/**
 * Alaska's zone 8, its interior, west and north: Bethel, Dillingham, Fairbanks North Star, Kusilvak (Wade Hampton until 2015), Nome,
 * North Slope, Northwest Arctic, Southeast Fairbanks, Yukon-Koyukuk. IECC before 2021, table R301.1, from memory, high confidence.
 * The rest of Alaska, Denali too, is 7.
 */
const coldAlaska = new Set(['02050', '02070', '02090', '02158', '02270', '02180', '02185', '02188', '02240', '02290']);

/** Counties that the list names otherwise: Oglala Lakota, SD (46102) was Shannon County (46113). */
const renamed: Record<string, string> = { '46102': '46113' };

function lookUp(countyFips: string): { zone: string; ground: ZoneGround } | undefined {
  const listed = zoneByCounty.get(renamed[countyFips] ?? countyFips);
  if (listed) return { zone: listed, ground: 'published' };
  if (/^091\d\d$/.test(countyFips)) return { zone: '5A', ground: 'published' };
  if (/^15\d{3}$/.test(countyFips)) return { zone: '1A', ground: 'memory' };
  if (countyFips === '11001') return { zone: '4A', ground: 'memory' };
  if (/^02\d{3}$/.test(countyFips)) return { zone: coldAlaska.has(countyFips) ? '8' : '7', ground: 'memory' };
  return undefined;
}

/**
 * IECC climate zone and moisture letter of a US county, looked up, never computed.
 * Connecticut's planning regions (091xx) are 5A as all its counties were. Hawaii 1A, DC 4A and Alaska 7 or 8 are from memory.
 * @param countyFips five digits
 * @returns '6B', or undefined for a county that is in no list (Puerto Rico and the island territories)
 * @example climateZone('30031') // '6B', Gallatin County, Montana
 */
export const climateZone = (countyFips: string): string | undefined => lookUp(countyFips)?.zone;

/** Whether a county's zone was read in the published list or is from memory. */
export const zoneGround = (countyFips: string): ZoneGround | undefined => lookUp(countyFips)?.ground;
