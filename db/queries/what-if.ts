import { knownWall } from '@/lib/care/films';
import { climateAt, stationById } from '@/lib/climate';
import { sunSite } from '@/lib/home/exposure';
import { whatIf } from '@/lib/home/what-if';
import { type WhatIfView } from '@/lib/home/what-if-words';
import { type Actor, Refused } from '@/lib/permissions';
import { homeFor } from '../scope';
import { careHomeAt } from './care-home';
import { costsSetAt } from './costs';
import { unitsOf } from './units';
import { wallsOfHome } from './walls';

/** What a change to a standing wall would do to its coat, for whoever may see the home. Throws `Refused`. */
export function wallWhatIf(actor: Actor, homeId: string, wallId: string, now: Date): WhatIfView {
  homeFor(actor, homeId, 'home.view');
  const { row, home } = careHomeAt(homeId, now);
  const stored = wallsOfHome(homeId).find(({ wall }) => wall.id === wallId)?.wall;
  const care = home.walls.find(({ id }) => id === wallId);
  const station = stationById(row.stationId);
  if (!stored || !care || !station) throw new Refused('not found', 'this wall');
  const { wall, coat } = knownWall(home, care);
  const site = sunSite({ latitude: row.latitude, longitude: row.longitude }, climateAt(station, row.elevationM));
  const asItStands = { ...stored, finish: wall.finish, texture: wall.texture, wood: wall.wood, areaM2: wall.areaM2, factor: coat.factor };
  const units = unitsOf(actor);
  const { now: today, variants } = whatIf(asItStands, { site, scheffer: home.scheffer, costs: home.costs }, units);
  return { facts: { now: today, areaM2: wall.areaM2, restainCentsPerM2: home.costs.restainCentsPerM2, pricesSet: costsSetAt(homeId) !== null, units }, variants };
}
