import { ActionForm } from '@/components/ui/action-form';
import { LinkButton } from '@/components/ui/button';
import { Course } from '@/components/ui/course';
import { Figure } from '@/components/ui/figure';
import { SubmitButton } from '@/components/ui/submit-button';
import { type DeferralChoice, waitWords } from '@/lib/care/deferral-choices';
import { capital, wallWords } from '@/lib/home/wall-words';
import { dollarWords } from '@/lib/money';
import { type ActionState } from '@/lib/schemas/action-state';
import { type WorkKind, workKinds } from '@/lib/schemas/vocabulary';

type Act = (previous: ActionState, form: FormData) => Promise<ActionState>;
type PutOffChoicesProps = {
  homeId: string;
  kind: WorkKind;
  walls: readonly { id: string; name: string }[];
  choices: readonly DeferralChoice[];
  /** Walls of which this work is put off already. */
  stands: readonly string[];
  putOff: Act;
  takeUp: Act;
};

/** What waiting costs, wall by wall, and the button that puts the work off. */
export function PutOffChoices({ homeId, kind, walls, choices, stands, putOff, takeUp }: PutOffChoicesProps) {
  const stripCents = choices.reduce((sum, { price }) => sum + (price?.stripCents ?? 0), 0);
  const named = (ids: readonly string[]) => wallWords(walls.filter(({ id }) => ids.includes(id)), walls.length);
  const hidden = (ids: readonly string[]) => (
    <>
      <input type="hidden" name="homeId" value={homeId} />
      <input type="hidden" name="kind" value={kind} />
      {ids.map((id) => (
        <input key={id} type="hidden" name="wallIds[]" value={id} />
      ))}
    </>
  );
  const ids = choices.map(({ wallId }) => wallId);
  return (
    <>
      <Course heading="If it waits" tone={stripCents > 0 ? 'ember' : 'plain'}>
        <ul className="max-w-3xl">
          {choices.map((one) => (
            <li key={one.wallId} className="border-t border-line py-3 first:border-t-0">
              <p className="text-lg">
                <strong>{capital(named([one.wallId]))}</strong>
              </p>
              <p>{waitWords(one)}</p>
              {one.price ? <Figure explanation={one.price.explanation} /> : null}
            </li>
          ))}
        </ul>
        {stripCents > 0 ? (
          <p className="mt-2 max-w-prose text-lg">
            <strong>A coat that old has to be stripped first: about {dollarWords(stripCents)} more</strong>, at this home’s prices. Washing and a maintenance coat are no longer enough.
          </p>
        ) : null}
      </Course>
      <Course as="div" tone="quiet">
        <ActionForm action={putOff} className="flex flex-wrap items-center gap-3">
          {hidden(ids)}
          <SubmitButton pendingLabel="Putting it off…">Put off the {workKinds[kind].toLowerCase()}</SubmitButton>
          <LinkButton href={`/homes/${homeId}/plan`} look="quiet">
            Leave it as planned
          </LinkButton>
        </ActionForm>
      </Course>
      {stands.length > 0 ? (
        <Course heading="Already put off" aside={capital(named(stands))}>
          <ActionForm action={takeUp} className="flex flex-wrap items-center gap-x-6 gap-y-3">
            {hidden(stands)}
            <p>Taking it up again brings back the days that the plan had before.</p>
            <SubmitButton look="quiet" pendingLabel="Taking it up…">
              Take it up again
            </SubmitButton>
          </ActionForm>
        </Course>
      ) : null}
    </>
  );
}
