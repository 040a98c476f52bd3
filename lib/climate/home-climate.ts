import { schefferIndex } from './scheffer';
import { type Station } from './stations';

/** A home's climate by month, January first: °C, days, kWh/m²·day, %. */
export type Climate = {
  meanC: number[];
  maxC: number[];
  minC: number[];
  wetDays: number[];
  ghiKwhM2Day: number[];
  humidityPct: number[];
  scheffer: number;
};

/** Temperature falls by this with height: 6.5 °C per km, ICAO standard atmosphere. */
const lapseCPerM = 0.0065;

/**
 * The station's climate at the home: temperatures corrected for the height difference when the home's elevation (m) is given.
 * The Scheffer index uses the corrected temperatures.
 */
export function climateAt(station: Station, elevationM?: number | null): Climate {
  const correction = elevationM === undefined || elevationM === null ? 0 : (station.elevationM - elevationM) * lapseCPerM;
  const celsius = (values: number[]) => values.map((fahrenheit) => ((fahrenheit - 32) * 5) / 9 + correction);
  const meanC = celsius(station.meanF);
  return {
    meanC,
    maxC: celsius(station.maxF),
    minC: celsius(station.minF),
    wetDays: station.wetDays,
    ghiKwhM2Day: station.ghiKwhM2Day,
    humidityPct: station.humidityPct,
    scheffer: schefferIndex(meanC.map((c) => (c * 9) / 5 + 32), station.wetDays),
  };
}
