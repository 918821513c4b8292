/** A slice is long against the clock's resolution and short against what else the machine does. */
const SLICE = 2e-3;

/**
 * Seconds per call of each contender, the best of many slices taken in turn: a busy machine slows all alike,
 * and the best slice is the one it disturbed least. `duration`: s for all of them together.
 */
export function inTurn(contenders: readonly (() => unknown)[], duration: number): number[] {
  const calls = contenders.map((run) => {
    for (let warm = seconds(); seconds() - warm < 0.05; ) run();
    const once = slice(run, 3);
    return Math.max(1, Math.round(SLICE / once));
  });
  const best = contenders.map(() => Number.POSITIVE_INFINITY);
  for (const end = seconds() + duration; seconds() < end; ) {
    contenders.forEach((run, i) => {
      best[i] = Math.min(best[i]!, slice(run, calls[i]!));
    });
  }
  return best;
}

function slice(run: () => unknown, calls: number): number {
  const start = seconds();
  for (let i = 0; i < calls; i++) run();
  return (seconds() - start) / calls;
}

export function seconds(): number {
  return Number(process.hrtime.bigint()) / 1e9;
}
