import { z } from 'zod';

const optionalText = z.string().trim().min(1).optional().or(z.literal('').transform(() => undefined));

const wholeNumber = (usual: number, most: number) => optionalText.transform((given) => Number(given ?? usual)).pipe(z.number().int().min(1).max(most));

/** Everything the application reads from its environment. `.env.example` explains each. */
export const environmentSchema = z.object({
  DATABASE_FILE: z.string().trim().min(1).default('data/eavewright.db'),
  NEXTAUTH_URL: z.url({ protocol: /^https?$/ }),
  NEXTAUTH_SECRET: z.string().min(32, 'must have at least 32 characters'),
  SMTP_URL: z.url({ protocol: /^smtps?$/, error: 'must be an smtp:// or smtps:// address' }),
  MAIL_FROM: z.string().trim().min(3),
  CRON_SECRET: optionalText.pipe(z.string().min(16, 'must have at least 16 characters').optional()),
  BOUNCE_SECRET: optionalText.pipe(z.string().min(16, 'must have at least 16 characters').optional()),
  MAIL_PER_RUN: wholeNumber(2000, 1_000_000),
  MAIL_PER_SECOND: wholeNumber(20, 10_000),
  MAILBOX_DIR: optionalText,
  BACKUP_DIR: z.string().trim().min(1).default('data/backups'),
});

export type Environment = z.infer<typeof environmentSchema>;

/** Throws an Error that names each variable at fault. */
export function parseEnvironment(raw: Record<string, string | undefined>): Environment {
  const parsed = environmentSchema.safeParse(raw);
  if (parsed.success) return parsed.data;
  const faults = parsed.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`The environment is not complete (see .env.example):\n${faults.join('\n')}`);
}
