import { LinkButton } from '@/components/ui/button';

/** What one does from the plan: log work, or look further ahead. */
export function PlanActions({ homeId, mayLog }: { homeId: string; mayLog: boolean }) {
  return (
    <>
      {mayLog ? <LinkButton href={`/homes/${homeId}/log`}>Log work</LinkButton> : null}
      <LinkButton href={`/homes/${homeId}/budget`} look="quiet">
        Years ahead
      </LinkButton>
    </>
  );
}
