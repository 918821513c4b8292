import { bundleSizes } from './bundle-sizes.ts';
import { coldStart } from './cold-start.ts';
import { bothIntegrators } from './integrators.ts';
import { predictions } from './predictions.ts';
import { heading, line, type Row } from './table.ts';
import { textToProblems } from './text.ts';

/** All measurements in one run, each ratio from times taken in turn. `root`: the repository, built. */
export function bench(root: string): void {
  const sections: readonly (readonly [title: string, note: string, rows: (root: string) => Row[]])[] = [
    [
      'One prediction of energy, peak and width against the raw rate equations',
      'which odex 2.0.4 solves with errors up to 1e-8',
      predictions,
    ],
    [
      'Integration in time of energy, peak and width, odex against ours',
      'each at the coarsest tolerance that keeps their errors below the one stated',
      bothIntegrators,
    ],
    ['Text to problems, a design of 300 lines', "against yaml's own parse of it", textToProblems],
    ['Command from a cold start, `check` on the demo', 'against `node -e 0`, started in turn', coldStart],
    ['Bundles', 'minified', bundleSizes],
  ];
  for (const [title, note, rows] of sections) {
    process.stdout.write(`\n${title},\n${note}\n${heading()}\n`);
    for (const row of rows(root)) process.stdout.write(`${line(row)}\n`);
  }
}
