/** One measurement: ours, what it is compared with, and the target their ratio must meet. */
export interface Row {
  readonly what: string;
  readonly ours: string;
  readonly other?: string;
  readonly ratio?: number;
  /** `least`: the ratio must be at least this; `most`: at most. */
  readonly target?: { readonly least: number } | { readonly most: number };
}

/** Widths that add up to 78 columns, two more for the gaps. */
export function heading(): string {
  return columns('', 'ours', 'other', 'ratio', 'target', '');
}

export function line({ what, ours, other = '', ratio, target }: Row): string {
  if (ratio === undefined || target === undefined) return columns(what, ours, other, '', '', '');
  const met = 'least' in target ? ratio >= target.least : ratio <= target.most;
  const wanted = 'least' in target ? `≥ ${target.least}` : `≤ ${target.most}`;
  return columns(what, ours, other, figure(ratio), wanted, met ? 'ok' : 'MISSES');
}

function columns(what: string, ours: string, other: string, ratio: string, target: string, verdict: string): string {
  const cells = [ours.padStart(9), other.padStart(9), ratio.padStart(6), target.padStart(6), verdict];
  return `${what.padEnd(34)}${cells.join('  ')}`.trimEnd();
}

function figure(ratio: number): string {
  return ratio >= 100 ? ratio.toFixed(0) : ratio.toPrecision(3);
}

/** A time in s to three figures. */
export function time(seconds: number): string {
  if (seconds < 1e-3) return `${(seconds * 1e6).toPrecision(3)} µs`;
  return `${(seconds * 1e3).toPrecision(3)} ms`;
}
