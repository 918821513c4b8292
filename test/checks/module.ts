import { readFileSync } from 'node:fs';
import { type Analysis, analyse } from '../../extension/core/analyse.ts';
import type { Prediction, PulseFigures } from '../../extension/core/physics/prediction.ts';
import type { Problem } from '../../extension/core/report/problem.ts';

export const SPEED_OF_LIGHT = 299_792_458;
export const PLANCK = 6.626_070_15e-34;

/** The text of the design named after a check, without its notes, some of it replaced. */
export function designOf(code: string, ...changes: readonly (readonly [from: string, to: string])[]): string {
  const url = new URL(`../designs/checks/${code}.gainmodule.yaml`, import.meta.url);
  let text = readFileSync(url, 'utf8').replace(/^#.*\n| +# expect:.*/g, '');
  for (const [from, to] of changes) {
    if (!text.includes(from)) throw new Error(`${code} has no "${from}"`);
    text = text.replace(from, to);
  }
  return text;
}

export function findingsOf(text: string, code: string): readonly Problem[] {
  return analyse(text).problems.filter((problem) => problem.code === code);
}

/** The one message of a code. */
export function messageOf(text: string, code: string): string {
  const found = findingsOf(text, code);
  if (found.length !== 1 || !found[0]) throw new Error(`${found.length} findings of ${code}`);
  return found[0].message;
}

export function predictionOf(text: string): Prediction {
  const { prediction, problems }: Analysis = analyse(text);
  if (!prediction) throw new Error(`no prediction: ${problems.map((problem) => problem.message).join(' ')}`);
  return prediction;
}

export function pulseOf(text: string): PulseFigures {
  const { pulse } = predictionOf(text);
  if (!pulse) throw new Error('no pulse');
  return pulse;
}

/** s: both directions through resonator and rod, in m. */
export function roundTrip(resonator: number, rod: number, groupIndex = 1.8354): number {
  return (2 * (resonator + (groupIndex - 1) * rod)) / SPEED_OF_LIGHT;
}
