import 'server-only';
import { type Environment, parseEnvironment } from '@/lib/schemas/environment';

let parsed: Environment | undefined;

export const environment = (): Environment => (parsed ??= parseEnvironment(process.env));
