import type { RequirementFigures, SurfaceFigures } from '../core/physics/prediction.ts';
import type { Problem } from '../core/report/problem.ts';
import { formatLimits, formatRequirement, requirementName } from '../core/report/requirement-text.ts';
import type { RequirementRow, SurfaceRow, Verdict } from '../protocol/readout.ts';
import { show } from './show.ts';

/** J/m² in one J/cm². */
const perSquareCentimetre = 1e4;

/** A surface's verdict is that of its findings, so that table and squiggles can't disagree. */
export function surfaceRow(surface: SurfaceFigures, index: number, problems: readonly Problem[]): SurfaceRow {
  const { name, peak_fluence_J_per_cm2, threshold_J_per_cm2, margin } = surface;
  const threshold = show(scaled(threshold_J_per_cm2), 'fluence');
  const marginText = margin === undefined ? undefined : `${show(margin, 'ratio')} ×`;
  return {
    name,
    fluence: show(peak_fluence_J_per_cm2 * perSquareCentimetre, 'fluence') ?? '',
    ...(threshold === undefined ? {} : { threshold }),
    ...(marginText === undefined ? {} : { margin: marginText }),
    verdict: margin === undefined ? 'unknown' : verdictOf(`surfaces[${index}]`, problems),
  };
}

function scaled(fluence: number | undefined): number | undefined {
  return fluence === undefined ? undefined : fluence * perSquareCentimetre;
}

function verdictOf(path: string, problems: readonly Problem[]): Verdict {
  const about = problems.filter((problem) => problem.path === path || problem.path.startsWith(`${path}.`));
  const severities = about.map(({ severity, accepted }) => accepted?.severity ?? severity);
  if (severities.includes('error')) return 'bad';
  return severities.includes('warning') ? 'look' : 'good';
}

export function requirementRow({ name, met, predicted, minimum, maximum }: RequirementFigures): RequirementRow {
  const words = requirementName(name);
  return {
    name: words.charAt(0).toUpperCase() + words.slice(1),
    required: formatLimits(name, minimum, maximum),
    ...(predicted === undefined ? {} : { predicted: formatRequirement(name, predicted) }),
    verdict: met === undefined ? 'unknown' : met ? 'good' : 'bad',
  };
}
