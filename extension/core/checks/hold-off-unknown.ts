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
              'Without `closed_loss` the switch is taken to block wholly: pre-lasing can not be seen, and the delay starts from spontaneous emission alone.',
            path: 'q_switch.kind',
          },
        ],
};
