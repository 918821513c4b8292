import type { RequirementFigures } from '../physics/prediction.ts';
import { formatRequirement } from '../report/requirement-text.ts';
import type { Check, Finding } from './check.ts';

/** A predicted figure outside the limits that the design itself sets. */
export const requirementMissed: Check = {
  code: 'requirement-missed',
  title: 'A requirement is missed',
  run: ({ outcome }) => outcome.figures.requirements.flatMap(missed),
};

function missed(requirement: RequirementFigures): Finding[] {
  const { name, predicted, minimum, maximum, met } = requirement;
  if (met !== false || predicted === undefined) return [];
  const below = minimum !== undefined && predicted < minimum;
  const limit = below ? minimum : (maximum ?? predicted);
  const text = (value: number) => formatRequirement(name, value);
  const percent = Math.abs(predicted / limit - 1) * 100;
  const by = limit === 0 ? '' : ` (${percent < 99.5 ? percent.toPrecision(2) : percent.toFixed(0)} %)`;
  return [
    {
      severity: 'error',
      message: `Predicted ${text(predicted)}: ${text(Math.abs(predicted - limit))}${by} ${below ? 'below the minimum' : 'above the maximum'} of ${text(limit)}.`,
      path: `requirements.${name}.${below ? 'min' : 'max'}`,
    },
  ];
}
