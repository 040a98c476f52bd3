import { type UnitSystem } from '@/lib/schemas/vocabulary';

/** Exact factors: the international foot, inch and US gallon (NIST Handbook 44, appendix C). */
export const metresPerFoot = 0.3048;
export const metresPerInch = 0.0254;
export const squareMetresPerSquareFoot = metresPerFoot ** 2;
export const litresPerGallon = 3.785411784;

export const feetToMetres = (feet: number) => feet * metresPerFoot;
export const metresToFeet = (metres: number) => metres / metresPerFoot;
export const inchesToMetres = (inches: number) => inches * metresPerInch;
export const metresToInches = (metres: number) => metres / metresPerInch;
export const ft2ToM2 = (ft2: number) => ft2 * squareMetresPerSquareFoot;
export const m2ToFt2 = (m2: number) => m2 / squareMetresPerSquareFoot;
export const gallonsToLitres = (gallons: number) => gallons * litresPerGallon;
export const litresToGallons = (litres: number) => litres / litresPerGallon;
export const fahrenheitToCelsius = (fahrenheit: number) => ((fahrenheit - 32) * 5) / 9;
export const celsiusToFahrenheit = (celsius: number) => (celsius * 9) / 5 + 32;
export const milesPerKm = 1 / 1.609344;

const plain = (value: number, digits: number) => Number(value.toFixed(digits)).toLocaleString('en-US', { maximumFractionDigits: digits });

/** 30 ft, 30.5 ft; 9.14 m. */
export const lengthText = (metres: number, units: UnitSystem) => (units === 'us' ? `${plain(metresToFeet(metres), 1)} ft` : `${plain(metres, 2)} m`);
/** 18 in; 46 cm. */
export const smallLengthText = (metres: number, units: UnitSystem) => (units === 'us' ? `${plain(metresToInches(metres), 2)} in` : `${plain(metres * 100, 1)} cm`);
/** 234 ft²; 21.7 m². */
export const areaText = (m2: number, units: UnitSystem) => (units === 'us' ? `${plain(m2ToFt2(m2), 0)} ft²` : `${plain(m2, 1)} m²`);
/** 3.5 gal; 13.2 L. */
export const volumeText = (litres: number, units: UnitSystem) => (units === 'us' ? `${plain(litresToGallons(litres), 1)} gal` : `${plain(litres, 1)} L`);
/** 68 °F; 20 °C. */
export const temperatureText = (celsius: number, units: UnitSystem) => (units === 'us' ? `${plain(celsiusToFahrenheit(celsius), 0)} °F` : `${plain(celsius, 0)} °C`);
/** 7 mi; 12 km. */
export const distanceText = (km: number, units: UnitSystem) => (units === 'us' ? `${plain(km * milesPerKm, 0)} mi` : `${plain(km, 0)} km`);

/** A stored length as a form shows it: feet or metres without trailing digits, so that 30 ft stays '30'. */
export const lengthField = (metres: number, units: UnitSystem) => String(Number((units === 'us' ? metresToFeet(metres) : metres).toFixed(units === 'us' ? 4 : 3)));
