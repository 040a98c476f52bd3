import tzlookup from '@photostructure/tz-lookup';

/** IANA time zone at degrees north and east (the @photostructure/tz-lookup table). */
export const timeZoneAt = (latitude: number, longitude: number): string => tzlookup(latitude, longitude);
