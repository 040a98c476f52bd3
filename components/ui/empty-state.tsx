import { type ReactNode } from 'react';
import { LinkButton } from '@/components/ui/button';

type EmptyStateProps = {
  title: ReactNode;
  /** What the first step is and what comes of it. */
  children: ReactNode;
  action?: { href: string; label: string };
  /** A worked example, drawn or written. */
  example?: ReactNode;
};

export function EmptyState({ title, children, action, example }: EmptyStateProps) {
  return (
    <div className="grid items-center gap-8 lg:grid-cols-2">
      <div className="grid max-w-xl justify-items-start gap-3">
        <h2>{title}</h2>
        <div className="grid gap-3">{children}</div>
        {action ? <LinkButton href={action.href}>{action.label}</LinkButton> : null}
      </div>
      {example ? <div className="min-w-0 border-l-4 border-line pl-4">{example}</div> : null}
    </div>
  );
}
