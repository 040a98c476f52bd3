import { Course } from '@/components/ui/course';
import { Figure } from '@/components/ui/figure';
import { changeWords, costWords, lifeWords, nowWords, variantExplained, type WhatIfView } from '@/lib/home/what-if-words';

/** What a deeper eave, another finish or another surface would do to a wall's coat, in years and in money; each row opens. */
export function WhatIf({ view: { facts, variants } }: { view: WhatIfView }) {
  return (
    <Course heading="What would change it" aside="One change at a time">
      <p className="mb-2 max-w-prose text-quiet">
        How long a coat would last, and what restaining would cost a year. The work of the change itself is not counted. {facts.pricesSet ? 'At the prices set for this home.' : 'At our example prices: nobody has set prices for this home yet.'}
      </p>
      <p className="mb-2 text-lg">{nowWords(facts.now)}</p>
      <ul className="grid gap-x-12 lg:grid-cols-2">
        {variants.map((variant) => {
          const name = changeWords(variant.change, facts.units);
          return (
            <li key={name} className="border-t border-line py-2">
              <Figure
                size="large"
                label={name}
                value={
                  <>
                    <span className="block text-xl">{lifeWords(variant)}</span>
                    <span className="block text-lg">{costWords(variant)}</span>
                  </>
                }
                explanation={variantExplained(variant, facts)}
              />
            </li>
          );
        })}
      </ul>
    </Course>
  );
}
