import type { Check } from './check.ts';
import { fluenceFinding } from './fluence.ts';

/** A surface sees more than its damage threshold. */
export const fluenceOverThreshold: Check = {
  code: 'fluence-over-threshold',
  title: 'A surface is past its damage threshold',
  run: (context) =>
    fluenceFinding(context, ({ margin, hotSpot, threshold, fluence }) =>
      margin < 1
        ? {
            severity: 'error',
            message: `Peak fluence ${fluence}${hotSpot} is past the threshold of ${threshold} at this pulse width: margin ${margin.toPrecision(3)}. Enlarge the beam here, lower the energy, or use a stronger coating.`,
          }
        : undefined,
    ),
};
