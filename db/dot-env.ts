import { existsSync } from 'node:fs';

/** For commands: reads `.env` where there is one, as the application does. What the shell has set wins. */
export function loadDotEnv(): void {
  if (existsSync('.env')) process.loadEnvFile('.env');
}
