import { z } from 'zod';
import { neededText } from '@/lib/schemas/measures';
import { azimuth } from '@/lib/schemas/wall';

/** What a form is about, sent along as hidden fields. */
export const homeTarget = z.object({ homeId: neededText('The home', 60) });
export const wallTarget = z.object({ homeId: neededText('The home', 60), wallId: neededText('The wall', 60) });
export const recordTarget = z.object({ recordId: neededText('The record', 60) });

export const turnSchema = homeTarget.extend({ compassDeg: azimuth });
