import { SelectField } from '@/components/ui/field';
import { type FilmState } from '@/lib/schemas/vocabulary';

const states: Record<FilmState, string> = {
  sound: 'Still sound: it would have lasted longer',
  due: 'Due: just right',
  'past due': 'Past due: it was gone in places',
};

/** How the film that was renewed was found: the wall learns from it. */
export function OldFilmField({ film }: { film: 'coat' | 'caulk' }) {
  return <SelectField label={`The old ${film} was`} name="oldFilm" options={states} empty="I did not look" hint="From this the wall’s own forecast gets better." />;
}
