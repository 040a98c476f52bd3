import { ESLint } from 'eslint';
import { expect, test } from 'vitest';

/** DEVELOPERS.md, "Who imports whom": a breach fails the check. */
const breaches: [file: string, from: string][] = [
  ['lib/sun/x.ts', '@/db/client'], ['lib/sun/x.ts', 'react'], ['lib/sun/x.ts', 'node:fs'], ['lib/sun/x.ts', 'drizzle-orm'], ['lib/sun/x.ts', '../../db/client'],
  ['db/queries/x.ts', '@/jobs/deliver'], ['db/queries/x.ts', 'nodemailer'], ['db/queries/x.ts', '@/app/_server/actor'],
  ['jobs/x.ts', '@/app/_server/actor'], ['jobs/x.ts', 'react'],
  ['components/ui/x.tsx', '@/db/queries/homes'], ['components/ui/x.tsx', '@/app/_server/actor'], ['components/ui/x.tsx', '@/jobs/deliver'],
  ['app/x.ts', '@/db/schema'], ['app/x.ts', '@/db/client'], ['app/x.ts', '@/tests/fixtures/home'],
];
const allowed: [file: string, from: string][] = [
  ['lib/sun/x.ts', 'suncalc'], ['lib/sun/x.ts', '@/lib/units'], ['lib/sun/x.ts', './position'], ['db/queries/x.ts', '@/lib/units'], ['db/queries/x.ts', 'drizzle-orm'],
  ['jobs/x.ts', '@/db/queries/mail'], ['jobs/x.ts', 'nodemailer'], ['components/ui/x.tsx', '@/lib/units'], ['components/ui/x.tsx', 'react'], ['app/x.ts', '@/db/queries/homes'], ['app/x.ts', '@/jobs/deliver'],
];

const eslint = new ESLint();

async function isRefused([file, from]: [string, string]): Promise<boolean> {
  const [result] = await eslint.lintText(`import { x } from '${from}';\n\nexport const y = x;\n`, { filePath: file });
  return (result?.messages ?? []).some(({ ruleId }) => ruleId === 'no-restricted-imports');
}

test('each layer may import what DEVELOPERS.md allows, and nothing else', { timeout: 60_000 }, async () => {
  for (const breach of breaches) expect([...breach, await isRefused(breach)]).toEqual([...breach, true]);
  for (const fine of allowed) expect([...fine, await isRefused(fine)]).toEqual([...fine, false]);
});
