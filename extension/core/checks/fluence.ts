import { surfaceFigures } from '../physics/damage.ts';
import type { Surface } from '../physics/gain-module.ts';
import { formatQuantity } from '../quantity/format.ts';
import type { CheckContext, Finding } from './check.ts';

interface Judged {
  readonly surface: Surface;
  readonly margin: number;
  /** Texts: margin and what it is made of. */
  readonly marginText: string;
  readonly against: string;
}

/** A pulse that surfaces are judged by: J, and full width at half maximum in s. */
interface JudgedPulse {
  readonly energy: number;
  readonly width: number;
}

/** Runs a verdict over every surface that has a margin; findings fall on the surface's beam radius. */
export function fluenceFinding(
  { module }: CheckContext,
  pulse: JudgedPulse | undefined,
  verdict: (judged: Judged) => Pick<Finding, 'severity' | 'message'> | undefined,
): Finding[] {
  if (!pulse) return [];
  return module.surfaces.flatMap((surface) => {
    const figures = surfaceFigures(module, surface, pulse.energy, pulse.width);
    if (figures.margin === undefined || figures.threshold_J_per_cm2 === undefined) return [];
    // Nothing to say of most surfaces: their texts would cost more than all the rest.
    if (figures.margin >= Math.max(1, surface.safetyFactor)) return [];
    const fluence = formatQuantity(figures.peak_fluence_J_per_cm2 * 1e4, 'fluence');
    const threshold = formatQuantity(figures.threshold_J_per_cm2 * 1e4, 'fluence');
    const hotSpot = surface.hotSpotFactor === 1 ? '' : ` times a hot-spot factor of ${surface.hotSpotFactor}`;
    const width = formatQuantity(pulse.width, 'time');
    const found = verdict({
      surface,
      margin: figures.margin,
      marginText: roundedDown(figures.margin),
      against: `peak fluence ${fluence}${hotSpot} against a threshold of ${threshold} at ${width}`,
    });
    return found ? [{ ...found, path: `${surface.path}.beam_radius` }] : [];
  });
}

/** Three significant digits, never up: a margin just short of 1 must not read 1.00. */
function roundedDown(margin: number): string {
  const step = 10 ** (Math.floor(Math.log10(margin)) - 2);
  return (Math.floor(margin / step + 1e-9) * step).toPrecision(3);
}
