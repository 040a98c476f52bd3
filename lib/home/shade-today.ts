import { type CalendarDay, monthOf } from '@/lib/calendar';
import { climateAt, stationById } from '@/lib/climate';
import { type ExposedWall, faceOf, sunSite } from '@/lib/home/exposure';
import { type ShadeOrder, shadeOrder } from '@/lib/sun';

type Home = { latitude: number; longitude: number; elevationM: number | null; timeZone: string; stationId: string };

/** The walls of a home in the order in which work follows the shade on a day; trees carry leaves in the home's warm months. */
export function shadeToday<W extends ExposedWall>(home: Home, walls: readonly W[], day: CalendarDay): ShadeOrder<W> {
  const place = { latitude: home.latitude, longitude: home.longitude };
  const station = stationById(home.stationId);
  const leafOn = station ? (sunSite(place, climateAt(station, home.elevationM)).leafOnMonths[monthOf(day) - 1] ?? true) : true;
  const faces = walls.map((stored) => ({ ...faceOf(stored), stored }));
  const order = shadeOrder(place, faces, day, home.timeZone, leafOn);
  return { ...order, walls: order.walls.map((one) => ({ ...one, wall: one.wall.stored })) };
}
