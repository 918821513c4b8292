import type { Check } from './check.ts';
import { fluenceFinding } from './fluence.ts';

/** A surface sees more than its damage threshold. */
export const fluenceOverThreshold: Check = {
  code: 'fluence-over-threshold',
  title: 'A surface is past its damage threshold',
  run: (context) =>
    fluenceFinding(context, context.outcome.train.settled, ({ margin, marginText, against }) =>
      margin < 1
        ? {
            severity: 'error',
            message: `Damage expected, margin ${marginText}: ${against}. Enlarge the beam here, lower the energy, or choose a coating with a higher threshold.`,
          }
        : undefined,
    ),
};
