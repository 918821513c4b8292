import { steps } from '../../core/design/steps.ts';
import { type Aim, aimOf, failuresOf, goalOf } from '../../core/explore/goals.ts';
import { slopeOf } from '../../core/explore/sensitivity.ts';
import { type Solution, solve } from '../../core/explore/solve.ts';
import type { Outcome } from '../../core/physics/predict.ts';
import type { Fix, Problem } from '../../core/report/problem.ts';
import { formatRequirement, requirementName } from '../../core/report/requirement-text.ts';
import { raised } from '../show.ts';
import type { Subject } from '../subject.ts';

/** What an engineer can turn: drive, coupling, geometry and timing, not the medium's own properties. */
const ADJUSTABLE = [
  'pump.power',
  'pump.diode.current',
  'pump.duration',
  'pump.beam.radius',
  'resonator.output_reflectivity',
  'resonator.length',
  'resonator.beam.radius',
  'q_switch.closed_loss',
  'q_switch.repetition_rate',
] as const;

const MOST_OFFERED = 4;

/** Values that would just settle a problem, those that need the least change first; each has been predicted. */
export function solvedFixes({ analysis, explorer }: Subject, problem: Problem): Fix[] {
  const { outcome } = analysis;
  const aim = problem.accepted === undefined ? aimOf(problem) : undefined;
  if (aim === undefined || outcome === undefined) return [];
  const candidates = [...ADJUSTABLE, ...(problem.path.startsWith('surfaces[') ? [problem.path] : [])];
  const solutions = candidates.flatMap((path): Solution[] => {
    const near = explorer.around(path);
    const found = near && slopeOf(near, aim.figure);
    if (!found || Math.abs(found.slope) < 1e-4) return [];
    const direction = found.slope > 0 === (aim.side === 'at least') ? 1 : -1;
    const solution = solve(analysis, path, goalOf(aim), direction);
    return solution ? [solution] : [];
  });
  return solutions
    .sort((a, b) => change(a, explorer.around(a.path)?.value) - change(b, explorer.around(b.path)?.value))
    .slice(0, MOST_OFFERED)
    .map((solution) => ({ title: titleOf(solution, aim, outcome), ...solution.edit }));
}

function change({ value }: Solution, present = value): number {
  return Math.abs(Math.log(value / present));
}

/** `Set pump power to 571 W: pulse energy 14.0 mJ`, with what it would break. */
function titleOf({ path, shown, outcome }: Solution, aim: Aim, before: Outcome): string {
  const result = aim.figure(outcome);
  const known = new Set(failuresOf(before));
  const broken = failuresOf(outcome).filter((name) => !known.has(name));
  const warning = broken.length === 0 ? '' : `, but then ${broken.join(', ')} fails`;
  const figure = result === undefined ? '' : `: ${requirementName(aim.name)} ${formatRequirement(aim.name, result)}`;
  return raised(`Set ${spoken(path)} to ${shown}${figure}${warning}`);
}

/** `pump.beam.radius` as `pump beam radius`, `surfaces[0].beam_radius` as `beam radius`. */
export function spoken(path: string): string {
  return steps(path)
    .filter((step) => typeof step === 'string' && step !== 'surfaces')
    .map((step) => String(step).replaceAll('_', ' '))
    .join(' ')
    .replace(/^resonator (?=output|beam)/, '')
    .replace(/^q switch /, '');
}
