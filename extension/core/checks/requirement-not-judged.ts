import { requirementName } from '../report/requirement-text.ts';
import type { Check } from './check.ts';

/** A requirement on a figure that this design has no prediction of. */
export const requirementNotJudged: Check = {
  code: 'requirement-not-judged',
  title: 'A requirement cannot be judged',
  run: ({ outcome }) =>
    outcome.figures.requirements.flatMap(({ name, predicted }) =>
      predicted !== undefined || !outcome.figures.pulse
        ? []
        : [
            {
              severity: 'warning' as const,
              message: `Not judged: there is no prediction of the ${requirementName(name)} here. ${REASON[name] ?? 'This release does not model it: verify it by measurement.'}`,
              path: `requirements.${name}`,
            },
          ],
    ),
};

const REASON: Readonly<Record<string, string>> = {
  hold_off_margin: 'It needs `q_switch.closed_loss`.',
  build_up_time: 'The laser starts before the switch opens, so no delay can be given.',
};
