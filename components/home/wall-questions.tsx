import { CheckField } from '@/components/ui/check-field';
import { type Choice, RadioCourses } from '@/components/ui/choice-courses';
import { Course } from '@/components/ui/course';
import { alsoAnswers, caulkAnswers, colorAnswers, filmAnswers, waterAnswers } from '@/lib/home/walkaround';
import { type Finish, keysOf } from '@/lib/schemas/vocabulary';

export type WalkedWall = { id: string; name: string; hint: string; finish: Finish };

const notSeen: Choice = { value: '', label: 'Did not look' };
const choices = (answers: Record<string, string>): Choice[] => [...Object.entries(answers).map(([value, label]) => ({ value, label })), notSeen];

/** What to look for on one wall. Paint-like coats peel, thin ones do not: only they are asked about it. */
export function WallQuestions({ wall }: { wall: WalkedWall }) {
  const ask = (legend: string, name: string, answers: Record<string, string>, hint?: string) => (
    <RadioCourses legend={legend} name={`walls.${wall.id}.${name}`} options={choices(answers)} defaultValue="" inRow {...(hint ? { hint } : {})} />
  );
  return (
    <Course heading={wall.name} aside={wall.hint}>
      <div className="grid max-w-4xl gap-6">
        {ask('Splash some water on it: what does it do?', 'water', waterAnswers, 'Where the sun works hardest, low and high.')}
        {ask('The color', 'color', colorAnswers)}
        {wall.finish === 'solid-color' ? ask('The coat', 'film', filmAnswers) : null}
        {ask('The caulk', 'caulk', caulkAnswers, 'Around windows and doors, at log ends, where boards meet.')}
        <fieldset className="grid gap-x-8 sm:grid-cols-2">
          <legend className="font-semibold">Also seen</legend>
          {keysOf(alsoAnswers).map((one) => (
            <CheckField key={one} label={alsoAnswers[one]} name={`walls.${wall.id}.also.${one}`} />
          ))}
        </fieldset>
      </div>
    </Course>
  );
}
