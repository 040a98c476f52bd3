import { loadDotEnv } from '@/db/dot-env';
import { type Environment, parseEnvironment } from '@/lib/schemas/environment';

let parsed: Environment | undefined;

/** The checked environment; a job started by hand also reads `.env`. What is set already wins over the file. */
export function environment(): Environment {
  if (!parsed) loadDotEnv();
  return (parsed ??= parseEnvironment(process.env));
}
