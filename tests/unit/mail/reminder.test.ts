// @vitest-environment jsdom
import { describe, expect, it } from 'vitest';
import { renderMail } from '@/lib/mail/registry';
import { reminderItem, reminderPropsWith } from '@/tests/fixtures/reminder-props';

const wallsWith = (items: Record<string, ReturnType<typeof reminderItem>[]>) =>
  ['North', 'East', 'South', 'West'].map((name) => ({ name, areaM2: 25.08, items: items[name] ?? [] }));

const read = (html: string) => new DOMParser().parseFromString(html, 'text/html');
const words = (text: string) => text.replace(/\s+/g, ' ');

describe('a reminder', () => {
  it('says what, when in words and by date, why, where to go and how to stop, in both forms', () => {
    const { html, text } = renderMail('reminder', reminderPropsWith());
    const page = read(html);
    for (const said of [words(text), words(page.body.textContent ?? '')]) {
      expect(said).toContain('Spring Creek');
      expect(said).toContain('Ada, one piece of work on one wall');
      expect(said).toContain('Restain: can be done now');
      expect(said).toContain('When: mid-May to early August 2027 (May 15 – August 9, 2027)');
      expect(said).toContain('Used up: June 10, 2027, in 4 weeks');
      expect(said).toContain('Why: The coat of June 2023 lasts about 4 years on this wall.');
      expect(said).toContain('you are the owner of Spring Creek');
      expect(said).toContain('Turn reminders off');
    }
    const targets = [...page.querySelectorAll('a')].map((link) => link.href);
    expect(targets).toEqual([
      'https://eavewright.example/homes/h1',
      'https://eavewright.example/do/log',
      'https://eavewright.example/do/put-off',
      'https://eavewright.example/do/stop',
      'https://eavewright.example/account',
    ]);
    for (const target of targets) expect(text.split('\n')).toContain(target);
  });

  it('says every sentence of one form in the other', () => {
    const props = reminderPropsWith({ walls: wallsWith({ North: [reminderItem({ kind: 'wash', stage: 'buy' })], West: [reminderItem({ stage: 'overdue' })] }) });
    const { html, text } = renderMail('reminder', props);
    const page = read(html);
    const plain = words(text);
    const sentences = [...page.querySelectorAll('p,h1,h2,a')].map((node) => words(node.textContent ?? '').trim()).filter((line) => line && line !== 'Eavewright');
    expect(sentences.length).toBeGreaterThan(25);
    for (const sentence of sentences) {
      // A heading's aside stands in brackets in plain text.
      expect(plain).toContain(sentence.replace(/^(\w+) (\d+ ft²)$/, '$1 ($2)'));
    }
  });

  it('keeps one band per wall in the order given, whatever is on them', () => {
    const { html, text } = renderMail('reminder', reminderPropsWith());
    const bands = [...read(html).querySelectorAll('h2')].map((title) => words(title.textContent ?? ''));
    expect(bands).toEqual(['North 270 ft²', 'East 270 ft²', 'South 270 ft²', 'West 270 ft²', 'Where people get hurt']);
    const at = ['North (', 'East (', 'South (', 'West ('].map((title) => text.indexOf(`\n${title}`));
    expect(at).toEqual([...at].sort((a, b) => a - b));
    expect(Math.min(...at)).toBeGreaterThan(0);
  });

  it('measures in the reader’s units: 30 ft × 9 ft is 270 ft² or 25.1 m²', () => {
    expect(renderMail('reminder', reminderPropsWith()).text).toContain('South (270 ft²)');
    const metric = renderMail('reminder', reminderPropsWith({ units: 'metric' })).text;
    expect(metric).toContain('South (25.1 m²)');
    expect(metric).not.toContain('270 ft²');
  });

  it('names the home and the most urgent thing in the subject', () => {
    const subjectOf = (items: Parameters<typeof wallsWith>[0]) => renderMail('reminder', reminderPropsWith({ walls: wallsWith(items) })).subject;
    expect(subjectOf({ South: [reminderItem()] })).toBe('Spring Creek: time to restain (South)');
    expect(subjectOf({ North: [reminderItem({ stage: 'book' })], East: [reminderItem({ stage: 'overdue', kind: 'wash' })], South: [reminderItem()] })).toBe(
      'Spring Creek: wash is overdue (East) and 2 more',
    );
    expect(subjectOf({ North: [reminderItem({ stage: 'book', kind: 'recaulk' })], West: [reminderItem({ stage: 'buy', kind: 'recaulk' })] })).toBe(
      'Spring Creek: buy for the recaulk (West) and 1 more',
    );
  });

  it('puts the most urgent work of a wall first', () => {
    const items = [reminderItem({ kind: 'recaulk', stage: 'buy' }), reminderItem({ kind: 'walkaround', stage: 'overdue' }), reminderItem({ stage: 'buy', dueOn: '2027-09-01' })];
    const { text } = renderMail('reminder', reminderPropsWith({ walls: wallsWith({ South: items }) }));
    expect(text.match(/^(Walkaround|Recaulk|Restain|Wash): .*$/gm)).toEqual(['Walkaround: overdue', 'Restain: time to buy', 'Recaulk: time to buy']);
  });

  it('sends nobody out in a season in which no coat can cure', () => {
    const textOn = (today: string) => renderMail('reminder', reminderPropsWith({ today, walls: wallsWith({ South: [reminderItem({ stage: 'overdue' })] }) })).text;
    expect(textOn('2026-12-01')).toContain('It missed its season; below is the next chance');
    expect(textOn('2026-12-01')).not.toContain('next dry spell');
    expect(textOn('2027-05-15')).toContain('Do it in the next dry spell');
    expect(textOn('2027-09-01')).not.toContain('missed its season');
  });

  it('says that a film is used up, but that a wash or an own rule is due', () => {
    const textOf = (values: Parameters<typeof reminderItem>[0]) => renderMail('reminder', reminderPropsWith({ walls: wallsWith({ South: [reminderItem(values)] }) })).text;
    expect(textOf({ kind: 'recaulk' })).toContain('\nUsed up: June 10, 2027');
    expect(textOf({ kind: 'wash' })).toContain('\nDue: June 10, 2027');
    expect(textOf({ ownRule: true })).toContain('\nDue: June 10, 2027');
  });

  it('refuses to be written about nothing', () => {
    expect(() => renderMail('reminder', reminderPropsWith({ walls: wallsWith({}) }))).toThrow('nothing to say');
  });
});

describe('the cautions in a reminder', () => {
  const textOf = (values: Parameters<typeof reminderPropsWith>[0]) => renderMail('reminder', reminderPropsWith(values)).text;

  it('warn of oil-wet rags only where the stain is oil', () => {
    expect(textOf({})).toContain('Rags wet with oil stain');
    expect(textOf({ stainBases: ['waterborne'] })).not.toContain('Rags wet with oil stain');
  });

  it('warn of lead in a home built before 1978 or in a year nobody knows', () => {
    expect(textOf({ yearBuilt: 1977 })).toContain('40 CFR 745.83');
    expect(textOf({ yearBuilt: null })).toContain('40 CFR 745.83');
    expect(textOf({ yearBuilt: 1978 })).not.toContain('40 CFR 745.83');
  });

  it('warn of isocyanates only where a polyurethane joint is recaulked', () => {
    const recaulk = wallsWith({ South: [reminderItem({ kind: 'recaulk' })] });
    expect(textOf({ walls: recaulk, sealants: ['polyurethane'] })).toContain('NIOSH');
    expect(textOf({ walls: recaulk, sealants: ['silicone'] })).not.toContain('NIOSH');
    expect(textOf({ sealants: ['polyurethane'] })).not.toContain('NIOSH');
  });

  it('always defer to label, code and tradesperson', () => {
    const walk = textOf({ walls: wallsWith({ South: [reminderItem({ kind: 'walkaround' })] }) });
    for (const text of [textOf({}), walk]) expect(text).toMatch(/label of the product, your local code and a licensed tradesperson decide/);
    expect(walk).toContain('Ladders');
    expect(walk).not.toContain('Rags wet');
  });
});
