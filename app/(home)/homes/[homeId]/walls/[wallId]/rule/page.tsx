import { type Metadata } from 'next';
import { notFound } from 'next/navigation';
import { pageData, pageHome, pageWall } from '@/app/_server/page-data';
import { ComputedRule } from '@/components/home/computed-rule';
import { OwnRuleForm } from '@/components/home/own-rule-form';
import { Confirm } from '@/components/ui/confirm';
import { Course } from '@/components/ui/course';
import { PageHead } from '@/components/ui/page-head';
import { careOfWall } from '@/db/queries/wall-care';
import { exactDay } from '@/lib/calendar-words';
import { computedWork, previewOwnRule } from '@/lib/care/own-preview';
import { ruleInWords } from '@/lib/care/own-rule';
import { ruleStart } from '@/lib/home/rule-start';
import { keysOf, workKinds } from '@/lib/schemas/vocabulary';
import { dropRule, saveRule } from './actions';

export const metadata: Metadata = { title: 'Own rule' };

type Props = { params: Promise<{ homeId: string; wallId: string }>; searchParams: Promise<{ kind?: string | string[] }> };

export default async function OwnRulePage({ params, searchParams }: Props) {
  const { homeId, wallId } = await params;
  const asked = (await searchParams).kind;
  const kind = keysOf(workKinds).find((one) => one === asked) ?? notFound();
  const { actor, view } = await pageHome(homeId);
  const { wall } = await pageWall(homeId, wallId);
  const { home, today } = pageData(() => careOfWall(actor, homeId, wallId, new Date()));
  const target = { homeId, wallId, kind };
  const own = home.ownRules.find((rule) => rule.wallId === wallId && rule.kind === kind);
  const computed = computedWork(home, target, today);
  const start = ruleStart(kind, own, computed, today);
  const work = workKinds[kind].toLowerCase();
  return (
    <main id="main">
      <PageHead
        title={`Own rule: ${work}`}
        lead={`When to ${work === 'walkaround' ? 'walk around' : work} ${wall.name}, by a rule of yours. The plan, the reminders and the calendar go by it.`}
        path={[{ href: '/homes', label: 'Homes' }, { href: `/homes/${homeId}`, label: view.home.name }, { href: `/homes/${homeId}/walls/${wallId}`, label: wall.name }]}
      />
      <Course heading="The computed rule" aside={own ? 'Set aside: the plan goes by yours.' : 'The plan goes by it now.'}>
        <ComputedRule item={computed} />
      </Course>
      <Course heading={own ? 'Your rule' : 'A rule of your own'}>
        <OwnRuleForm action={saveRule} target={target} start={start} first={previewOwnRule(home, { wallId, kind, rule: start.rule, startOn: start.startOn }, today)} />
      </Course>
      {own ? (
        <Course heading="Go back">
          <Confirm label="Go back to the computed rule" look="quiet" question={`Go back to the computed rule for the ${work} of ${wall.name}?`} confirm="Go back to the computed rule" action={dropRule} fields={target}>
            <p>
              Your rule goes: {ruleInWords(own.rule)}; start {exactDay(own.startOn)}. You can write it again at any time. What was logged stays.
            </p>
          </Confirm>
        </Course>
      ) : null}
    </main>
  );
}
