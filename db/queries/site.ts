import { resolveSite, type Site, type SiteQuestion, type TypedPlace } from '@/lib/home/site';
import { findPostalCode } from './places';

/** Where a home is, from what was typed and the table of postal codes. Public data: no actor. */
export const siteFor = (typed: TypedPlace): Site | SiteQuestion => resolveSite(typed, findPostalCode(typed.postalCode));
