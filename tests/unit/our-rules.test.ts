import { existsSync, readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { ourRules } from '@/lib/our-rules';
import { type OurRule } from '@/lib/our-rules/rule';

const root = path.resolve(import.meta.dirname, '..', '..');
const read = (file: string) => readFileSync(path.join(root, file), 'utf8');
const sources = (folder: string) => readdirSync(path.join(root, folder), { recursive: true, encoding: 'utf8' }).filter((file) => /\.tsx?$/.test(file)).map((file) => path.join(folder, file));
const rules = Object.values(ourRules).flatMap((of) => Object.entries<OurRule>(of));
/** The list itself, the page that shows it, and the type that names the ground. */
const isList = (file: string) => ['lib/explain.ts', 'app/(public)/sources/page.tsx'].includes(file) || file.startsWith('lib/our-rules');
const saysSo = /(?<!y)\bour (own )?rules?\b|ourRule\(/i;

describe('the list of our own rules', () => {
  it.each(rules)('%s stands where it says', (_name, { where }) => {
    expect(where.length).toBeGreaterThan(0);
    for (const file of where) expect([file, existsSync(path.join(root, file)) && saysSo.test(read(file))]).toEqual([file, true]);
  });

  it('names every file that says “our rule”', () => {
    const named = new Set(rules.flatMap(([, { where }]) => where));
    const silent = ['lib', 'db', 'jobs', 'components', 'app'].flatMap(sources).filter((file) => !isList(file) && saysSo.test(read(file)) && !named.has(file));
    expect(silent).toEqual([]);
  });

  it('is where every figure takes its own rules from', () => {
    const own = ['lib', 'db', 'jobs', 'app', 'components'].flatMap(sources).filter((file) => file !== 'lib/our-rules.ts' && /ground: 'our rule'/.test(read(file)));
    expect(own).toEqual([]);
  });

  it('gives each rule once, in plain words, with its ground', () => {
    expect(new Set(rules.map(([name]) => name)).size).toBe(rules.length);
    expect(new Set(rules.map(([, { text }]) => text)).size).toBe(rules.length);
    expect(new Set(rules.map(([, { because }]) => because)).size).toBe(rules.length);
    for (const [name, { text, because }] of rules) {
      expect([name, /[a-z\d%)²]$/.test(text), /\.$/.test(because)]).toEqual([name, true, true]);
      expect([name, /[a-z][A-Z]|_|undefined/.test(`${text} ${because}`.replaceAll('kWh', ''))]).toEqual([name, false]);
    }
  });
});
