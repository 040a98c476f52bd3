import { type Html, html, webAddress } from './html';
import { type Course, type Letter, type Look, oneLine, type Part } from './letter';

/** Light colours of the look (app/globals.css): mail clients know no variables. */
const colour = { mist: '#EDF1EF', snow: '#FBFCFB', ink: '#18211D', spruce: '#1E4B39', quiet: '#51635A', line: '#C9D3CD', ember: '#A53F15', honey: '#C98A2E' };
const letters = "'Atkinson Hyperlegible Next',Verdana,Geneva,sans-serif";
const headings = "'Bricolage Grotesque',Georgia,serif";

const looks: Record<Look, string> = {
  plain: `color:${colour.ink}`,
  strong: `color:${colour.ink};font-weight:bold`,
  quiet: `color:${colour.quiet};font-size:14px;line-height:21px`,
  'due soon': `color:${colour.ink};font-weight:bold;border-left:6px solid ${colour.honey};padding-left:10px`,
  overdue: `color:${colour.ember};font-weight:bold;border-left:6px solid ${colour.ember};padding-left:10px`,
};

const paragraph = (style: string, content: Html) =>
  html`<p style="margin:0 0 8px;font-family:${letters};font-size:16px;line-height:24px;${style}">${content}</p>`;

function button(label: string, url: string): Html {
  return html`<table role="presentation" cellpadding="0" cellspacing="0" border="0" style="margin:8px 0"><tr><td bgcolor="${colour.spruce}" style="border-radius:4px"><a href="${webAddress(url)}" style="display:inline-block;padding:12px 20px;font-family:${letters};font-size:16px;line-height:20px;font-weight:bold;color:#FFFFFF;text-decoration:none">${label}</a></td></tr></table>`;
}

function part(item: Part, quiet = false): Html {
  const look = quiet ? looks.quiet : looks.plain;
  if (item.as === 'fact') return paragraph(look, html`<b>${item.label}:</b> ${item.text}`);
  if (item.as === 'text') return paragraph(quiet ? looks.quiet : looks[item.look ?? 'plain'], html`${item.text}`);
  if (item.look === 'button') return button(item.label, item.url);
  return paragraph(look, html`<a href="${webAddress(item.url)}" style="color:${colour.spruce}">${item.label}</a>`);
}

function band(course: Course): Html {
  const edge = course.mark === 'overdue' ? colour.ember : course.mark === 'due soon' ? colour.honey : colour.line;
  const aside = course.aside ? html` <span style="font-family:${letters};font-size:14px;font-weight:normal;color:${colour.quiet}">${course.aside}</span>` : '';
  const title = course.title
    ? html`<h2 style="margin:0 0 8px;font-family:${headings};font-size:19px;line-height:26px;color:${colour.ink}">${course.title}${aside}</h2>`
    : '';
  return html`<tr><td bgcolor="${colour.snow}" style="padding:16px 24px;border-bottom:3px solid ${edge}">${title}${course.parts.map((item) => part(item))}</td></tr>`;
}

/** The HTML form: one table of full-width bands, all styles inline, nothing loaded from elsewhere. */
export function writeHtml(letter: Letter): string {
  const heading = oneLine(letter.heading);
  return html`<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1"><meta name="color-scheme" content="light"><title>${oneLine(letter.subject)}</title></head>
<body style="margin:0;padding:0;background:${colour.mist}">
<table role="presentation" width="100%" cellpadding="0" cellspacing="0" border="0" bgcolor="${colour.mist}"><tr><td align="center" style="padding:0">
<table role="presentation" width="100%" cellpadding="0" cellspacing="0" border="0" style="max-width:640px;text-align:left">
<tr><td bgcolor="${colour.spruce}" style="padding:20px 24px"><p style="margin:0;font-family:${letters};font-size:14px;line-height:20px;color:#FFFFFF">Eavewright</p><h1 style="margin:4px 0 0;font-family:${headings};font-size:24px;line-height:31px;color:#FFFFFF">${heading}</h1></td></tr>
${letter.courses.map(band)}
<tr><td style="padding:16px 24px 32px">${letter.footer.map((item) => part(item, true))}</td></tr>
</table></td></tr></table>
</body></html>
`.markup;
}
