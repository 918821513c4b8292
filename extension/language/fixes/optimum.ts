import { failuresOf } from '../../core/explore/goals.ts';
import { rewriting } from '../../core/explore/rewrite.ts';
import { vary } from '../../core/explore/vary.ts';
import type { Fix } from '../../core/report/problem.ts';
import { show } from '../show.ts';
import type { Subject } from '../subject.ts';

const path = 'resonator.output_reflectivity';

/** The output reflectivity of most energy, where the design isn't there already. */
export function optimumFix({ analysis }: Subject): Fix | undefined {
  const { prediction, outcome } = analysis;
  const optimum = prediction?.coupling.optimum_reflectivity;
  const present = outcome?.cavity.module.resonator.outputReflectivity;
  if (optimum === undefined || present === undefined) return undefined;
  const written = rewriting(analysis, path, optimum, 3, 'nearest');
  const changed = written && vary(analysis, [{ path, value: written.value }]);
  const energy = changed?.figures.pulse?.energy_J;
  if (written?.value === present || !written || changed === undefined || energy === undefined || outcome === undefined)
    return undefined;
  const known = new Set(failuresOf(outcome));
  const broken = failuresOf(changed).filter((name) => !known.has(name));
  const warning = broken.length === 0 ? '' : `, but then ${broken.join(', ')} fails`;
  const title = `Set output reflectivity to the optimum, ${written.shown}: pulse energy ${show(energy, 'energy')}${warning}`;
  return { title, ...written.edit };
}
