import type { Check } from './check.ts';

/** The gain reaches what the closed switch can hold, so that the module lases before it is told to. */
export const holdOff: Check = {
  code: 'hold-off',
  title: 'The closed switch does not hold off lasing',
  run({ outcome: { cavity, train } }) {
    const { unheldGain } = train;
    if (unheldGain === undefined) return [];
    const limit = cavity.loss + cavity.closedLog;
    const needed = neededLoss(unheldGain - cavity.loss);
    return [
      {
        severity: 'error',
        message: `It lases before the switch opens: closed, it holds off a round-trip log gain of ${limit.toPrecision(3)}, and the pump would store ${unheldGain.toPrecision(3)}. The prediction stops filling at what is held. Needed: a closed loss above ${needed} per round trip, or less pump.`,
        path: 'q_switch.closed_loss',
      },
    ];
  },
};

/** Closed loss 1 − e^−excess in percent, rounded up, with as many nines as matter: `99.9994 %`. */
function neededLoss(excess: number): string {
  const passed = 100 * Math.exp(-excess);
  const decimals = Math.max(0, Math.min(12, 1 - Math.floor(Math.log10(passed))));
  const step = 10 ** -decimals;
  return `${(100 - Math.floor(passed / step) * step).toFixed(decimals)} %`;
}
