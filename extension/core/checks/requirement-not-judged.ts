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
              message: `${name.replaceAll('_', ' ')} is not predicted for this design, so nothing says whether it is met. ${REASON[name] ?? 'Verify it by measurement.'}`,
              path: `requirements.${name}`,
            },
          ],
    ),
};

const REASON: Readonly<Record<string, string>> = {
  hold_off_margin: 'Give `q_switch.closed_loss`.',
  build_up_time: 'The closed switch does not hold off.',
};
