import type { RequirementFigures, SurfaceFigures } from '../core/physics/prediction.ts';
import type { Problem } from '../core/report/problem.ts';
import type { RequirementRow, SurfaceRow, Verdict } from '../protocol/readout.ts';
import { type Kind, show } from './show.ts';

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
  if (about.some(({ severity }) => severity === 'error')) return 'bad';
  return about.some(({ severity }) => severity === 'warning') ? 'look' : 'good';
}

const kinds: Readonly<Record<string, Kind>> = {
  pulse_energy: 'energy',
  first_pulse_energy: 'energy',
  pulse_width: 'time',
  build_up_time: 'time',
  timing_jitter: 'time',
  peak_power: 'power',
  average_power: 'power',
  repetition_rate: 'frequency',
  energy_stability: 'percent',
  divergence: 'angle',
};

export function requirementRow(requirement: RequirementFigures): RequirementRow {
  const [key = '', bound = ''] = requirement.name.split(' ');
  const kind = kinds[key] ?? 'ratio';
  const predicted = show(requirement.predicted, kind);
  const name = key.replaceAll('_', ' ');
  return {
    name: name.charAt(0).toUpperCase() + name.slice(1),
    required: `${bound === 'max' ? '≤' : '≥'} ${show(requirement.required, kind)}`,
    ...(predicted === undefined ? {} : { predicted }),
    verdict: requirement.met === undefined ? 'unknown' : requirement.met ? 'good' : 'bad',
  };
}
