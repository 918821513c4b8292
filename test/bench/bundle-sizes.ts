import { statSync } from 'node:fs';
import { join } from 'node:path';
import type { Row } from './table.ts';

const BUDGETS = [
  ['server.cjs', 600],
  ['server-worker.js', 600],
  ['extension.cjs', 450],
  ['extension-web.cjs', 450],
  ['giantpulse.cjs', 500],
  ['readout.js', 400],
] as const;

/** Sizes in kB (1000 bytes) against their budgets. */
export function bundleSizes(root: string): Row[] {
  return BUDGETS.map(([file, budget]) => {
    const size = statSync(join(root, 'dist', file)).size / 1000;
    return {
      what: file,
      ours: `${size.toFixed(0)} kB`,
      other: `${budget} kB`,
      ratio: size / budget,
      target: { most: 1 },
    };
  });
}
