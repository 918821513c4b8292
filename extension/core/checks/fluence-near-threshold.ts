import type { Check } from './check.ts';
import { fluenceFinding } from './fluence.ts';

/** A surface keeps less margin than the design wants. */
export const fluenceNearThreshold: Check = {
  code: 'fluence-near-threshold',
  title: 'A surface keeps less than the wanted safety factor',
  run: (context) =>
    fluenceFinding(context, context.outcome.train.settled, ({ margin, marginText, against, surface }) =>
      margin >= 1 && margin < surface.safetyFactor
        ? {
            severity: 'warning',
            message: `Margin ${marginText}, wanted ${surface.safetyFactor}: ${against}.`,
          }
        : undefined,
    ),
};
