export { type CoatingMonth, type CoatingSeason, coatingSeason, lowestTemperature, type MonthRating } from './coating-season';
export { type Climate, climateAt } from './home-climate';
export { bareGroundAlbedo, groundAlbedo } from './snow';
export { type DecayHazard, decayHazard, schefferIndex } from './scheffer';
export { distanceKm, nearestStation, type Station, stationById, stations } from './stations';
export { timeZoneAt } from './time-zone';
export { climateZone, zoneGround } from './zones';
