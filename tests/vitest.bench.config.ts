import path from 'node:path';
import { defineConfig } from 'vitest/config';

const root = path.resolve(__dirname, '..');

/** Benchmarks print ratios within one run; they are no part of the tests. */
export default defineConfig({ root, resolve: { alias: { '@': root } }, test: { benchmark: { include: ['tests/bench/**/*.bench.ts'] } } });
