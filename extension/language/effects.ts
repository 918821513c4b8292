import type { EffectName } from '../core/explore/sensitivity.ts';

export const effectLabels: Readonly<Record<EffectName, string>> = {
  energy: 'energy',
  peak: 'peak power',
  width: 'width',
  margin: 'tightest margin',
};

/** Below this part of the change that causes it, an effect is none. */
const negligible = 5e-5;

/** A relative change as a signed percentage of two digits, `+0.83 %`, `−1.2 %`; `0 %` where nothing changes. */
export function signedPercent(relative: number): string {
  const percent = relative * 100;
  if (Math.abs(percent) < negligible) return '0 %';
  const digits = Math.abs(percent) >= 100 ? percent.toFixed(0) : String(Number(Math.abs(percent).toPrecision(2)));
  return `${percent < 0 ? '−' : '+'}${digits.replace('-', '')} %`;
}
