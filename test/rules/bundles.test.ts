import { statSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { expect, it } from 'vitest';

const dist = join(dirname(fileURLToPath(import.meta.url)), '../../dist');

/** Budgets in bytes, minified. */
it.each([
  ['server.cjs', 600_000],
  ['server-worker.js', 600_000],
  ['extension.cjs', 450_000],
  ['extension-web.cjs', 450_000],
  ['giantpulse.cjs', 500_000],
  ['readout.js', 400_000],
])('%s stays within its budget', (file, budget) => {
  const { size } = statSync(join(dist, file));
  expect(size).toBeGreaterThan(10_000);
  expect(size).toBeLessThan(budget);
});
