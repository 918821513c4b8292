import type { Check } from './check.ts';

/** No closed loss is given. */
export const holdOffUnknown: Check = {
  code: 'hold-off-unknown',
  title: 'Hold-off cannot be judged',
  run: ({ module }) =>
    module.qSwitch.closedLoss !== undefined
      ? []
      : [
          {
            severity: 'information',
            message:
              'Hold-off is not judged: without `closed_loss` the closed switch is taken to block everything. Give its loss per round trip to have pre-lasing found.',
            path: 'q_switch.kind',
          },
        ],
};
