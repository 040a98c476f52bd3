// @vitest-environment jsdom
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { framed } from '@/lib/mail/framed';
import { escapeHtml, html, webAddress } from '@/lib/mail/html';
import { oneLine } from '@/lib/mail/letter';
import { isSecret, renderMail } from '@/lib/mail/registry';
import { reminderItem, reminderPropsWith } from '@/tests/fixtures/reminder-props';

const read = (html: string) => new DOMParser().parseFromString(html, 'text/html');
const hostile = `</title><script>alert("1")</script><img src=x onerror='1'>&amp;`;

describe('text that people typed', () => {
  it('stays text in HTML: a browser reads back exactly what was typed', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme' }), (typed) => {
        const body = read(`<!doctype html><body><p title="${escapeHtml(typed)}">${escapeHtml(typed)}</p>`).querySelector('p');
        // HTML turns NUL away and CR into LF (WHATWG HTML, input stream); neither can be typed into a form field.
        const kept = typed.replace(/\r\n?/g, '\n').replaceAll('\0', '');
        expect(body?.textContent?.replaceAll('\uFFFD', '')).toBe(kept.replaceAll('\uFFFD', ''));
        expect(body?.children).toHaveLength(0);
      }),
    );
  });

  it('cannot bring markup into a reminder from any field', () => {
    const { html: page } = renderMail(
      'reminder',
      reminderPropsWith({
        homeName: hostile,
        personName: hostile,
        walls: [{ name: hostile, areaM2: 10, items: [reminderItem({ because: hostile })] }],
      }),
    );
    const document = read(page);
    expect(document.querySelectorAll('script,img')).toHaveLength(0);
    expect(document.querySelector('h2')?.textContent).toContain(hostile);
    expect(document.querySelectorAll('[onerror]')).toHaveLength(0);
  });

  it('cannot bring markup into the other mails', () => {
    const link = 'https://eavewright.example/confirm?token=abc';
    const pages = [
      renderMail('verify', { name: hostile, url: link, hours: 24 }),
      renderMail('reset', { name: hostile, url: link, hours: 1 }),
      renderMail('shared', { homeName: hostile, place: hostile, byName: hostile, membership: 'contractor', url: link }),
    ];
    for (const { html: page } of pages) expect(read(page).querySelectorAll('script,img')).toHaveLength(0);
  });

  it('cannot start a new line in a subject or break out of its line in plain text', () => {
    const { subject, text } = renderMail('shared', {
      homeName: 'Cabin\r\nBcc: everybody@example.com',
      place: null,
      byName: 'Ada\nLovel\u0000y',
      membership: 'contractor',
      url: 'https://eavewright.example/homes/h1',
    });
    expect(subject).toBe('Ada Lovel y shared Cabin Bcc: everybody@example.com with you');
    expect(text.split('\n').some((line) => line.startsWith('Bcc:'))).toBe(false);
    expect(oneLine('x'.repeat(400))).toHaveLength(150);
  });
});

describe('the html template', () => {
  it('escapes values and lets nested templates and lists through', () => {
    const parts = ['<a>', 'b'].map((text) => html`<i>${text}</i>`);
    expect(html`<p>${'&'}${parts}${7}</p>`.markup).toBe('<p>&amp;<i>&lt;a&gt;</i>\n<i>b</i>7</p>');
  });

  it('links to web addresses only', () => {
    expect(() => webAddress('javascript:alert(1)')).toThrow('not a web address');
    expect(webAddress('https://eavewright.example/x')).toBe('https://eavewright.example/x');
  });
});

describe('a message in a frame', () => {
  it('may load nothing from elsewhere and opens its links outside the frame, with or without a head', () => {
    for (const page of ['<html><head lang="en"><title>t</title></head><body><a href="https://example.test">x</a></body></html>', '<a href="https://example.test">x</a>']) {
      const document = read(framed(page));
      expect(document.head.querySelector('meta')?.content).toMatch(/^default-src 'none'/);
      expect(document.head.querySelector('base')?.target).toBe('_blank');
      expect(document.body.querySelector('a')?.textContent).toBe('x');
    }
  });
});

describe('every mail', () => {
  const url = 'https://eavewright.example/confirm?token=abc&next=%2Fhomes';
  const samples: [string, unknown][] = [
    ['verify', { name: 'Ada', url, hours: 24 }],
    ['sign-in', { url, hours: 1 }],
    ['reset', { name: null, url, hours: 1 }],
    ['already-known', { name: 'Ada', signInUrl: url, forgotUrl: 'https://eavewright.example/forgot' }],
    ['shared', { homeName: 'Spring Creek', place: 'Bozeman, MT', byName: 'Ada', membership: 'contractor', url }],
    ['reminder', reminderPropsWith({ planUrl: url })],
  ];

  it.each(samples)('%s carries its link in both forms and loads nothing from elsewhere', (kind, props) => {
    const { html: page, text, subject } = renderMail(kind, props);
    const document = read(page);
    expect(subject.length).toBeGreaterThan(10);
    expect([...document.querySelectorAll('a')].map((link) => link.getAttribute('href'))).toContain(url);
    expect(text.split('\n')).toContain(url);
    expect(document.querySelectorAll('link,style,script,img,iframe')).toHaveLength(0);
    expect(document.querySelectorAll('table:not([role=presentation])')).toHaveLength(0);
    expect(document.documentElement.lang).toBe('en');
  });

  it('with a sign-in, confirmation or password link is secret, the others are not', () => {
    expect(samples.filter(([kind]) => isSecret(kind)).map(([kind]) => kind)).toEqual(['verify', 'sign-in', 'reset']);
  });

  it('is refused when its props do not fit or its kind is unknown', () => {
    expect(() => renderMail('verify', { name: 'Ada', url: 'not a url', hours: 24 })).toThrow();
    expect(() => renderMail('invoice', {})).toThrow('no such mail');
  });
});
