import { Course } from '@/components/ui/course';
import { learnedInputs, learnedWords } from '@/lib/care/learned-words';
import { type FilmLife } from '@/lib/care/types';

/** What a wall's own history has taught about its films, film by film; nothing where nothing was learned. */
export function LearnedCourse({ films }: { films: readonly FilmLife[] }) {
  const taught = films.filter(({ learned }) => learned.length > 0);
  if (taught.length === 0) return null;
  return (
    <Course heading="What this wall has taught" aside="Each film that was looked at counts once. Our rule.">
      <div className="grid max-w-3xl gap-5">
        {taught.map((film) => (
          <div key={film.film}>
            <p className="text-lg">{learnedWords(film)}</p>
            <dl className="mt-1">
              {learnedInputs(film).map(({ label, value }) => (
                <div key={label} className="grid gap-x-6 border-t border-line py-2 sm:grid-cols-[minmax(0,1fr)_auto]">
                  <dt>{label}</dt>
                  <dd className="font-semibold tabular-nums">{value}</dd>
                </div>
              ))}
            </dl>
          </div>
        ))}
      </div>
    </Course>
  );
}
