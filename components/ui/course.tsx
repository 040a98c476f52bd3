import { type ReactNode, useId } from 'react';

export type Tone = 'plain' | 'quiet' | 'honey' | 'ember' | 'roof';

const tones: Record<Tone, string> = {
  plain: '',
  quiet: 'course-quiet',
  honey: 'course-honey',
  ember: 'course-ember',
  roof: 'course-roof on-roof',
};

type CourseProps = {
  children: ReactNode;
  heading?: ReactNode;
  /** A short line under the heading. */
  aside?: ReactNode;
  level?: 2 | 3;
  tone?: Tone;
  as?: 'section' | 'div' | 'li' | 'article';
  id?: string;
  className?: string;
};

/** A full-width band. On wide screens its heading stands to the left of what it says. */
export function Course({ children, heading, aside, level = 2, tone = 'plain', as: Tag = 'section', id, className = '' }: CourseProps) {
  const headingId = useId();
  const Heading = `h${level}` as const;
  return (
    <Tag id={id} aria-labelledby={heading && Tag !== 'div' ? headingId : undefined} className={`course ${tones[tone]} ${className}`}>
      <div className={`within py-6 md:py-8 ${heading ? 'grid gap-x-10 gap-y-4 lg:grid-cols-[14rem_minmax(0,1fr)]' : ''}`}>
        {heading ? (
          <div>
            <Heading id={headingId}>{heading}</Heading>
            {aside ? <div className={`mt-1 text-sm ${tone === 'roof' ? '' : 'text-quiet'}`}>{aside}</div> : null}
          </div>
        ) : null}
        <div className="min-w-0">{children}</div>
      </div>
    </Tag>
  );
}
