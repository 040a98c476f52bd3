import { type SiteQuestion } from '@/lib/home/site';

/** A question about the place, beside the fields that answer it. */
export const siteFault = ({ ask, why }: SiteQuestion): Record<string, string> =>
  ask === 'coordinates' ? { latitude: why, longitude: 'Degrees east; the United States are negative, like −111.04.' } : { climateZoneOverride: why };
