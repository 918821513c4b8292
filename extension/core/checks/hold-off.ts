import type { Check } from './check.ts';

/** The gain reaches what the closed switch can hold, so that the module lases before it is told to. */
export const holdOff: Check = {
  code: 'hold-off',
  title: 'The closed switch does not hold off lasing',
  run({ outcome: { cavity, train } }) {
    const { unheldGain } = train;
    if (unheldGain === undefined) return [];
    const limit = cavity.loss + cavity.closedLog;
    const needed = -Math.expm1(cavity.loss - unheldGain);
    return [
      {
        severity: 'error',
        message: `The closed switch holds off a round-trip log gain of ${limit.toPrecision(3)}, and the pump would reach ${unheldGain.toPrecision(3)}: it pre-lases, and the prediction stops filling there. A closed loss above ${(needed * 100).toPrecision(4)} % would hold.`,
        path: 'q_switch.closed_loss',
      },
    ];
  },
};
