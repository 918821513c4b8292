import { spawnSync } from 'node:child_process';
import { join } from 'node:path';
import { seconds } from './stopwatch.ts';
import { type Row, time } from './table.ts';

const STARTS = 40;

/** The command's start and an empty one in turn: medians, and the best of each. */
export function coldStart(root: string): Row[] {
  const demo = join(root, 'extension/demo/hail_lidar.gainmodule.yaml');
  const command = [join(root, 'dist/giantpulse.cjs'), 'check', demo];
  const ours: number[] = [];
  const empty: number[] = [];
  for (let i = 0; i < STARTS; i++) {
    ours.push(start(command));
    empty.push(start(['-e', '0']));
  }
  const target = { most: 2 };
  return (['median', 'minimum'] as const).map((which) => {
    const [a, b] = [ours, empty].map((times) => pick(times, which)) as [number, number];
    return { what: which, ours: time(a), other: time(b), ratio: a / b, target };
  });
}

function start(args: string[]): number {
  const begin = seconds();
  const { status, error } = spawnSync(process.execPath, args, { stdio: 'ignore' });
  if (error || status !== 0) throw new Error(`${args.join(' ')} ended with ${error?.message ?? status}`);
  return seconds() - begin;
}

function pick(times: readonly number[], which: 'median' | 'minimum'): number {
  const sorted = [...times].sort((a, b) => a - b);
  return sorted[which === 'median' ? Math.floor(sorted.length / 2) : 0] ?? Number.NaN;
}
