import { EFFECT_NAMES, type Sensitivity } from '../core/explore/sensitivity.ts';
import type { Spreads } from '../core/explore/spread.ts';
import { effectLabels, signedPercent } from './effects.ts';
import type { Subject } from './subject.ts';

/** Fractions that the trade changes by percentage points. */
const IN_POINTS = /(reflectivity|loss|transmission)$/;

/** What a change of the value at a path does to the pulse, and what its tolerance and all tolerances do. */
export function sensitivityHelp({ explorer }: Subject, path: string): readonly string[] {
  const found = explorer.sensitivity(path);
  if (found === undefined || Object.keys(found.effects).length === 0) return [];
  const still = Object.values(found.effects).every((effect) => Math.abs(effect) < 1e-4);
  if (still) return ['A small change of it leaves the pulse and the tightest margin as they are.'];
  const blocks = [table(found, path)];
  if (found.oneSided)
    blocks.push('For an increase: a decrease does otherwise, since a limit or another time lies just here.');
  const parameter = explorer.parameters().find((one) => one.path === path);
  if (!parameter?.tolerance) return blocks;
  const relative = parameter.tolerance / Math.abs(parameter.value);
  const alone = EFFECT_NAMES.flatMap((name) => {
    const effect = found.effects[name];
    return effect === undefined ? [] : [`${effectLabels[name]} ± ${plainPercent(effect * relative)}`];
  });
  return [...blocks, `Its tolerance alone: ${alone.join(', ')}.`, ...spreadHelp(explorer.spreads())];
}

/** All written tolerances together and which one rules, in a sentence; none where no tolerance is written. */
export function spreadHelp(spreads: Spreads): readonly string[] {
  const parts = EFFECT_NAMES.flatMap((name) => {
    const spread = spreads[name];
    if (spread === undefined) return [];
    const share = spread.share > 0.995 ? 'all of it' : `${(spread.share * 100).toFixed(0)} %`;
    return [`${effectLabels[name]} ± ${plainPercent(spread.relative)} (${share} from \`${spread.dominant}\`)`];
  });
  return parts.length === 0 ? [] : [`All tolerances, root sum of squares: ${parts.join(', ')}.`];
}

function table({ effects, value }: Sensitivity, path: string): string {
  const names = EFFECT_NAMES.filter((name) => effects[name] !== undefined);
  const row = (label: string, change: number) =>
    `| ${label} | ${names.map((name) => signedPercent((effects[name] ?? 0) * change)).join(' | ')} |`;
  return [
    // Wide blanks keep the columns apart: editors draw tables without any.
    `| Change | ${names.map((name) => `\u2003${effectLabels[name]}`).join(' | ')} |`,
    `|:--|${names.map(() => '--:').join('|')}|`,
    row('+1 %', 0.01),
    ...(IN_POINTS.test(path) ? [row('+1 percentage point', 0.01 / value)] : []),
  ].join('\n');
}

function plainPercent(relative: number): string {
  return signedPercent(Math.abs(relative)).replace('+', '');
}
