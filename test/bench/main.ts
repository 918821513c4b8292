import { bundleSizes } from './bundle-sizes.ts';
import { coldStart } from './cold-start.ts';
import { editing, serving } from './editor.ts';
import { bothIntegrators } from './integrators.ts';
import { predictions } from './predictions.ts';
import { heading, line, type Row } from './table.ts';
import { textToProblems } from './text.ts';
import { typing } from './typing.ts';

/** `npm run bench -- typing` types 200 designs instead. All measurements in one run, each ratio from times taken in turn. `root`: the repository, built. */
export async function bench(root: string, what?: string): Promise<void> {
  if (what === 'typing') return typing(root);
  const sections: readonly (readonly [title: string, note: string, rows: (root: string) => Row[] | Promise<Row[]>])[] =
    [
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
      ['The editor, a design of 300 lines', "against yaml's own parse of it", editing],
      ['The language server as a process', 'started against `node -e 0`, edited against one open design', serving],
      ['Command from a cold start, `check` on the demo', 'against `node -e 0`, started in turn', coldStart],
      ['Bundles', 'minified', bundleSizes],
    ];
  for (const [title, note, rows] of sections) {
    process.stdout.write(`\n${title},\n${note}\n${heading()}\n`);
    for (const row of await rows(root)) process.stdout.write(`${line(row)}\n`);
  }
}
