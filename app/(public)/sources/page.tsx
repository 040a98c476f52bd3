import { type Metadata } from 'next';
import { sources } from './sources';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { ourRules } from '@/lib/our-rules';
import { type OurRule } from '@/lib/our-rules/rule';

export const metadata: Metadata = { title: 'Sources of the figures', description: 'Who published the figures that Eavewright computes with, and which rules are its own.' };

export default function SourcesPage() {
  return (
    <>
      <PageHead title="Sources of the figures" lead="What was published by others, with thanks, and what is our own judgment. Every computed figure in the product opens to show its inputs, its formula and its source." />
      {sources.map((group) => (
        <Course key={group.heading} heading={group.heading}>
          <dl className="grid max-w-3xl gap-5">
            {group.entries.map((entry) => (
              <div key={entry.name}>
                <dt className="font-semibold">{entry.name}</dt>
                <dd>{entry.used}</dd>
                <dd className="text-sm text-quiet">{entry.credit}</dd>
              </div>
            ))}
          </dl>
        </Course>
      ))}
      <Course heading="Our own rules" aside="Chosen by us, not published by anybody. The product says “our rule” where it uses one.">
        <div className="grid max-w-3xl gap-8">
          {Object.entries(ourRules).map(([about, rules]) => (
            <section key={about} aria-label={about}>
              <h3 className="mb-3">{about}</h3>
              <ul className="grid gap-4">
                {Object.entries<OurRule>(rules).map(([name, rule]) => (
                  <li key={name} className="border-l-4 border-lichen pl-4">
                    {rule.text}. <span className="text-quiet">Why: {rule.because}</span>
                  </li>
                ))}
              </ul>
            </section>
          ))}
        </div>
      </Course>
    </>
  );
}
