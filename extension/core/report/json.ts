import type { Analysis } from '../analyse.ts';
import { createPositions, positionsOf } from './position.ts';

/** `giantpulse predict --format json`: one object, SI with the unit in the name, what does not apply left out. */
export function predictionJson(file: string, text: string, analysis: Analysis): string {
  const positionAt = createPositions(text);
  const { prediction, design, problems } = analysis;
  // The limits are the file's own, and the figure stands under its own name: name and verdict are enough.
  const requirements = prediction?.requirements.map(({ name, met }) => ({ name, ...(met !== undefined && { met }) }));
  const title = design.values.title;
  const findings = problems.map(({ code, severity, message, path, range, accepted }) => ({
    code,
    severity,
    ...(accepted && { accepted: accepted.reason }),
    message,
    path,
    range: positionsOf(range, positionAt),
  }));
  return `${JSON.stringify({ file, ...(title !== undefined && { title }), ...prediction, ...(requirements && { requirements }), findings }, null, 2)}\n`;
}
