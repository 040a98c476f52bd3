import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { ComputedRule } from '@/components/home/computed-rule';
import { WallWork } from '@/components/home/wall-work';
import { planHome } from '@/lib/care';
import { careHome, careRecord } from '@/tests/fixtures/care-home';

const today = '2026-12-01';
const items = planHome(careHome({ records: [careRecord('restain', '2024-06-10')] }), today).walls[0]?.items ?? [];
const shown = (mayEdit: boolean) => renderToStaticMarkup(<WallWork homeId="h1" wallId="w1" items={items} today={today} mayLog mayEdit={mayEdit} mayPutOff={mayEdit} />);
const ruleLinks = (html: string) => [...html.matchAll(/href="\/homes\/h1\/walls\/w1\/rule\?kind=(\w+)"/g)].map(([, kind]) => kind).sort();

describe('the work of a wall', () => {
  it('leads to an own rule for every kind of work, also where nothing is planned', () => {
    expect(items.map(({ kind }) => kind)).not.toContain('recaulk');
    expect(ruleLinks(shown(true))).toEqual(['recaulk', 'restain', 'walkaround', 'wash']);
    expect(shown(true)).toContain('Recaulk: nothing is planned.');
  });

  it('shows no such link to who may not change the home', () => {
    expect(ruleLinks(shown(false))).toEqual([]);
    expect(shown(false)).not.toContain('nothing is planned');
  });
});

describe('the work of a wall that may be put off', () => {
  it('leads to what waiting would mean, for who may decide it', () => {
    expect(shown(true)).toContain('href="/homes/h1/put-off?kind=restain&amp;wall=w1"');
    expect(shown(false)).not.toContain('put-off');
  });
});

describe('the computed rule', () => {
  it('stands in words and as RFC 5545 writes it', () => {
    const item = items.find(({ kind }) => kind === 'restain');
    const html = renderToStaticMarkup(<ComputedRule item={item} />);
    expect(html).toMatch(/Every \d+ months \(\d years( \d+ months?)?\), counted from the start\./);
    expect(html).toContain(`<code class="break-all">${item?.rule}</code>`);
    expect(html).toContain('It counts from June 10, 2024.');
  });

  it('says so when there is no day to count from', () => {
    expect(renderToStaticMarkup(<ComputedRule item={undefined} />)).toContain('no day to count from');
  });
});
