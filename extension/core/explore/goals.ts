import { surfaceFigures } from '../physics/damage.ts';
import type { Outcome } from '../physics/predict.ts';
import type { Problem } from '../report/problem.ts';
import type { FigureOf } from './sensitivity.ts';
import type { Goal } from './solve.ts';

/** What would settle a problem: the figure it is about, and the least or most that it may be. */
export interface Aim {
  readonly figure: FigureOf;
  /** SI, of the figure of a design that may have changed. */
  readonly limit: (outcome: Outcome) => number | undefined;
  readonly side: 'at least' | 'at most';
  /** A name of `requirements`, or a margin. */
  readonly name: string;
}

/** Undefined for problems that no value of the design settles by degrees. */
export function aimOf({ code, path }: Problem): Aim | undefined {
  const surface = Number(/^surfaces\[(\d+)\]/.exec(path)?.[1]);
  switch (code) {
    case 'requirement-missed': {
      const [, name = '', bound] = path.split('.');
      const required = ({ figures }: Outcome) => figures.requirements.find((one) => one.name === name);
      return {
        name,
        figure: (outcome) => required(outcome)?.predicted,
        limit: (outcome) => (bound === 'min' ? required(outcome)?.minimum : required(outcome)?.maximum),
        side: bound === 'min' ? 'at least' : 'at most',
      };
    }
    case 'fluence-over-threshold':
    case 'fluence-near-threshold':
      return marginAim(surface, ({ figures }) => figures.surfaces[surface]?.margin);
    case 'fluence-after-pause':
      return marginAim(surface, ({ cavity: { module }, train: { afterPause } }) => {
        const judged = module.surfaces[surface];
        return judged && afterPause && surfaceFigures(module, judged, afterPause.energy, afterPause.width).margin;
      });
    case 'hold-off':
      return {
        name: 'hold_off_margin',
        figure: ({ holdOffMargin }) => holdOffMargin,
        limit: ({ figures }) => figures.requirements.find(({ name }) => name === 'hold_off_margin')?.minimum ?? 1,
        side: 'at least',
      };
    default:
      return undefined;
  }
}

function marginAim(surface: number, figure: FigureOf): Aim {
  return {
    name: 'margin',
    figure,
    limit: ({ cavity }) => cavity.module.surfaces[surface]?.safetyFactor,
    side: 'at least',
  };
}

/** Relative distance to the limit, positive on the good side. */
export function goalOf({ figure, limit, side }: Aim): Goal {
  return (outcome) => {
    const [value, bound] = [figure(outcome), limit(outcome)];
    if (value === undefined || bound === undefined || bound === 0) return undefined;
    return side === 'at least' ? value / bound - 1 : 1 - value / bound;
  };
}

/** Names of what fails: requirements, surfaces past their threshold, hold-off. */
export function failuresOf({ figures, train, cavity }: Outcome): readonly string[] {
  return [
    ...figures.requirements.flatMap(({ name, met }) => (met === false ? [name.replaceAll('_', ' ')] : [])),
    ...figures.surfaces.flatMap(({ name, margin = 1 }, index) =>
      margin < (cavity.module.surfaces[index]?.safetyFactor ?? 1) ? [`margin of ${name}`] : [],
    ),
    ...(train.unheldGain === undefined ? [] : ['hold-off']),
  ];
}
