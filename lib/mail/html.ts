/** Markup that is already safe. Everything else that goes into `html` is escaped. */
export class Html {
  constructor(readonly markup: string) {}
}

const entities: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

export const escapeHtml = (text: string): string => text.replace(/[&<>"']/g, (character) => entities[character] ?? '');

const safe = (value: string | number | Html | Html[]): string => {
  if (Array.isArray(value)) return value.map((part) => part.markup).join('\n');
  return value instanceof Html ? value.markup : escapeHtml(String(value));
};

/** html`<b>${name}</b>` escapes `name`; nested `html` goes in as it is. */
export function html(strings: TemplateStringsArray, ...values: (string | number | Html | Html[])[]): Html {
  return new Html(strings.reduce((markup, part, i) => markup + safe(values[i - 1] ?? '') + part));
}

/** A link target that may stand in an e-mail: http and https only; anything else throws. */
export function webAddress(url: string): string {
  const { protocol } = new URL(url);
  if (protocol !== 'http:' && protocol !== 'https:') throw new TypeError(`not a web address: ${protocol}`);
  return url;
}
