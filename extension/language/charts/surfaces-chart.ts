import type { Analysis } from '../../core/analyse.ts';
import type { Bar, BarChart } from '../../protocol/chart.ts';
import { surfaceRow } from '../verdicts.ts';

/** Peak fluence on every surface, hot spots counted, against its threshold; undefined without a pulse or surfaces. */
export function surfacesChart({ prediction, outcome, problems }: Analysis): BarChart | undefined {
  if (prediction?.pulse === undefined || prediction.surfaces.length === 0) return undefined;
  const bars = prediction.surfaces.map((surface, index): Bar => {
    const { hotSpotFactor = 1, safetyFactor = 1 } = outcome?.cavity.module.surfaces[index] ?? {};
    const limit = surface.threshold_J_per_cm2;
    return {
      label: surface.name,
      value: shown(surface.peak_fluence_J_per_cm2 * hotSpotFactor),
      ...(limit !== undefined && { limit: shown(limit), wanted: shown(limit / safetyFactor) }),
      verdict: surfaceRow(surface, index, problems).verdict,
    };
  });
  return {
    kind: 'bars',
    id: 'surfaces',
    title: 'Fluence on the surfaces',
    axis: { label: 'Peak fluence, hot spots counted', unit: 'J/cm²', scale: 1e4 },
    bars,
    summary: `Peak fluence against damage threshold: ${bars.map(spoken).join('; ')}.`,
  };
}

function spoken({ label, value, limit }: Bar): string {
  const against = limit === undefined ? 'no threshold for this pulse' : `of ${limit.toPrecision(3)}`;
  return `${label} ${value.toPrecision(3)} ${against} J/cm²`;
}

function shown(value: number): number {
  return Number(value.toPrecision(6));
}
