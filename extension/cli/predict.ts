import { analyse } from '../core/analyse.ts';
import { predictionJson } from '../core/report/json.ts';
import { predictionText } from '../core/report/text.ts';
import { readOrTell } from './read.ts';
import type { World } from './world.ts';

/** Prints one design's prediction. 0 with a pulse, 1 without one, 2 could not run. */
export function predict(file: string, format: 'text' | 'json', world: World): number {
  const text = readOrTell(file, world);
  if (text === undefined) return 2;
  const analysis = analyse(text);
  world.out(format === 'json' ? predictionJson(file, text, analysis) : predictionText(file, text, analysis));
  return analysis.prediction?.pulse ? 0 : 1;
}
