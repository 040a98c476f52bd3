import { type Source } from '@/lib/explain';
import { filmRules } from '@/lib/our-rules/films';
import { moneyRules } from '@/lib/our-rules/money';
import { pageRules } from '@/lib/our-rules/page';
import { planRules } from '@/lib/our-rules/plan';
import { type OurRule } from '@/lib/our-rules/rule';
import { sunRules } from '@/lib/our-rules/sun';

/** Every rule that is our own judgement, by what it is about: the one list that figures and the page of sources take them from. */
export const ourRules = {
  'Sun, shade and climate': sunRules,
  'How long coats and caulk last': filmRules,
  'The plan': planRules,
  'Trips, prices and buying': moneyRules,
  'The day, and what is drawn': pageRules,
};

const all = { ...sunRules, ...filmRules, ...planRules, ...moneyRules, ...pageRules };

/** One of our own rules as the source of a figure. */
export const ourRule = (name: keyof typeof all): Source => ({ text: (all[name] as OurRule).text, ground: 'our rule' });
