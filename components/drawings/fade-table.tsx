import { type FadeWall } from '@/components/drawings/fade-time';
import { usedUpOn } from '@/components/drawings/fade-stretches';
import { type CalendarDay } from '@/lib/calendar';
import { exactDay, exactRange } from '@/lib/calendar-words';
import { workKinds } from '@/lib/schemas/vocabulary';

const film = (one: FadeWall['coat']) => (one.startedOn ? `from ${exactDay(one.startedOn)}, used up ${exactDay(usedUpOn(one.startedOn, one.lifeMonths))}` : 'not known');

/** The same facts as the strips, for those who do not see them. */
export function FadeTable({ today, walls }: { today: CalendarDay; walls: readonly FadeWall[] }) {
  return (
    <div className="sr-only">
    <table>
      <caption>Coat, caulk, past and coming work of each wall; today is {exactDay(today)}</caption>
      <thead>
        <tr>
          {['Wall', 'Coat', 'Caulk', 'Done', 'To come'].map((heading) => (
            <th key={heading} scope="col">
              {heading}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {walls.map((wall) => (
          <tr key={wall.id}>
            <th scope="row">{wall.name}</th>
            <td>{film(wall.coat)}</td>
            <td>{film(wall.seal)}</td>
            <td>{wall.past.map((work) => `${workKinds[work.kind]} ${exactDay(work.doneOn)}`).join('; ') || 'nothing known'}</td>
            <td>{wall.coming.map((work) => `${workKinds[work.kind]} ${exactRange(work.opensOn, work.closesOn)}`).join('; ') || 'nothing planned'}</td>
          </tr>
        ))}
      </tbody>
    </table>
    </div>
  );
}
