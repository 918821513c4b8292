import type { Surface } from '../physics/gain-module.ts';
import { formatQuantity } from '../quantity/format.ts';
import type { CheckContext, Finding } from './check.ts';

interface Judged {
  readonly surface: Surface;
  readonly margin: number;
  /** Texts. */
  readonly fluence: string;
  readonly threshold: string;
  readonly hotSpot: string;
}

/** Runs a verdict over every surface that has a margin; findings fall on the surface's beam radius. */
export function fluenceFinding(
  { module, outcome }: CheckContext,
  verdict: (judged: Judged) => Pick<Finding, 'severity' | 'message'> | undefined,
): Finding[] {
  return module.surfaces.flatMap((surface, index) => {
    const figures = outcome.figures.surfaces[index];
    if (figures?.margin === undefined || figures.threshold_J_per_cm2 === undefined) return [];
    const found = verdict({
      surface,
      margin: figures.margin,
      fluence: formatQuantity(figures.peak_fluence_J_per_cm2 * 1e4, 'fluence'),
      threshold: formatQuantity(figures.threshold_J_per_cm2 * 1e4, 'fluence'),
      hotSpot: surface.hotSpotFactor === 1 ? '' : ` with a hot-spot factor of ${surface.hotSpotFactor}`,
    });
    return found ? [{ ...found, path: `${surface.path}.beam_radius` }] : [];
  });
}
