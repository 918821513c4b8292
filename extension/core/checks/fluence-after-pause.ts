import { surfaceFigures } from '../physics/damage.ts';
import type { Check } from './check.ts';
import { fluenceFinding } from './fluence.ts';

/** The pulse after a pause, the store filled up, leaves a surface less margin than wanted, though the settled one does not. */
export const fluenceAfterPause: Check = {
  code: 'fluence-after-pause',
  title: 'The pulse after a pause takes the margin of a surface',
  run(context) {
    const { settled, afterPause } = context.outcome.train;
    return fluenceFinding(context, afterPause, ({ margin, marginText, against, surface }) => {
      const usual = settled && surfaceFigures(context.module, surface, settled.energy, settled.width).margin;
      if (usual === undefined || usual < surface.safetyFactor || margin >= surface.safetyFactor) return undefined;
      const message = `After a pause, the store full, the margin falls to ${marginText}, wanted ${surface.safetyFactor}: ${against}. Ramp the first pulses, or forbid pauses in the firmware.`;
      return { severity: 'warning', message };
    });
  },
};
