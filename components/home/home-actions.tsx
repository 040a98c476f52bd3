import { LinkButton } from '@/components/ui/button';

type HomeActionsProps = { homeId: string; mayEdit: boolean; mayLog: boolean };

/** Everything that one does with a home. */
export function HomeActions({ homeId, mayEdit, mayLog }: HomeActionsProps) {
  const to = (page: string) => `/homes/${homeId}/${page}`;
  return (
    <>
      {mayLog ? <LinkButton href={to('log')}>Log work</LinkButton> : null}
      <nav aria-label="This home" className="-ml-2 flex flex-wrap">
        {[['day', 'Today'], ...(mayLog ? [['walkaround', 'Walkaround']] : []), ['plan', 'Plan'], ['record', 'Record'], ['buy', 'Buy'], ['share', 'Share'], ...(mayEdit ? [['edit', 'Edit']] : [])].map(([page, label]) => (
          <LinkButton key={page} href={to(page ?? '')} look="plain">
            {label}
          </LinkButton>
        ))}
      </nav>
    </>
  );
}
