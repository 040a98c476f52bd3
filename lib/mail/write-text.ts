import { type Letter, oneLine, type Part } from './letter';

const rule = '-'.repeat(60);

function part(item: Part): string {
  if (item.as === 'fact') return `${item.label}: ${oneParagraph(item.text)}`;
  if (item.as === 'link') return `${item.label}:\n${item.url}`;
  return oneParagraph(item.text);
}

const oneParagraph = (text: string) => text.replace(/\s+/g, ' ').trim();

/** The plain-text form: the same words, bands divided by a line of dashes. */
export function writeText(letter: Letter): string {
  const courses = letter.courses.map((course) => {
    const title = course.title ? [oneParagraph(course.aside ? `${course.title} (${course.aside})` : course.title)] : [];
    return [...title, ...course.parts.map(part)].join('\n');
  });
  return [oneLine(letter.heading), ...courses, letter.footer.map(part).join('\n')].join(`\n\n${rule}\n\n`) + '\n';
}
