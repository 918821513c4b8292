import { describe, expect, it } from 'vitest';
import { apart, flatModule, lossOf, moduleWith, outcomeOf, pumpedTo } from './modules.ts';

const gaussian = { profile: 'gaussian', radius: 0.9e-3 } as const;
const limitOf = (module: ReturnType<typeof moduleWith>) =>
  lossOf(module) - Math.log(1 - (module.qSwitch.closedLoss ?? 0));

describe('a closed switch that does not hold', () => {
  it.each([
    ['flat pump under a Gaussian mode', moduleWith({ qSwitch: { closedLoss: 0.3 } })],
    ['Gaussian under Gaussian', moduleWith({ pump: { beam: gaussian }, qSwitch: { closedLoss: 0.6 } })],
    ['one inversion', pumpedTo(2, flatModule({ qSwitch: { closedLoss: 0.5 } }))],
  ])('stops filling where the gain reaches it: %s', (_, module) => {
    const held = outcomeOf(moduleWith({ qSwitch: { closedLoss: 0.999999 } }, module));
    const { figures, train, holdOffMargin, cavity } = outcomeOf(module);
    const limit = limitOf(module);
    expect(held.figures.state.round_trip_gain_log!).toBeGreaterThan(limit);
    expect(apart(figures.state.round_trip_gain_log!, limit)).toBeLessThan(1e-12);
    expect(apart(holdOffMargin!, limit / held.figures.state.round_trip_gain_log!)).toBeLessThan(1e-12);
    expect(apart(train.unheldGain!, held.figures.state.round_trip_gain_log!)).toBeLessThan(1e-12);
    // The profile is kept: every ring holds the same part of what it would have held.
    const part = limit / held.figures.state.round_trip_gain_log!;
    for (let k = 0; k < cavity.rings.weight.length; k++) {
      expect(apart(train.store.ions[k]!, part * held.train.store.ions[k]!)).toBeLessThan(1e-12);
    }
    expect(figures.pulse!.energy_J).toBeLessThan(held.figures.pulse!.energy_J);
  });

  it('gives the pulse of a pump that just fills it', () => {
    const module = pumpedTo(2, flatModule({ qSwitch: { closedLoss: 0.5 } }));
    const just = outcomeOf(pumpedTo(limitOf(module) * (1 - 1e-9), module)).figures.pulse!;
    const over = outcomeOf(module).figures.pulse!;
    expect(apart(over.energy_J, just.energy_J)).toBeLessThan(1e-7);
    expect(apart(over.peak_power_W, just.peak_power_W)).toBeLessThan(1e-7);
    expect(apart(over.width_fwhm_s, just.width_fwhm_s)).toBeLessThan(1e-7);
  });

  it('decays from the limit where the switch opens late', () => {
    const module = moduleWith({ qSwitch: { closedLoss: 0.3, opensAt: 230e-6 } });
    const { figures, train } = outcomeOf(module);
    expect(train.unheldGain).toBeDefined();
    expect(apart(figures.state.round_trip_gain_log!, limitOf(module) * Math.exp(-30 / 230))).toBeLessThan(1e-12);
  });
});

describe('hold-off of a continuous train', () => {
  const rate = 10e3;
  const base = flatModule({
    pump: { kind: 'continuous' },
    qSwitch: { repetitionRate: rate, opensAt: 1 / rate, gate: 40e-6, closedLoss: 0.3 },
  });
  const limit = limitOf(base);

  it('is not spent at a rate that never fills the store, but is after a pause', () => {
    const module = pumpedTo(1.15 * limit, base);
    const { figures, train } = outcomeOf(module);
    expect(figures.state.round_trip_gain_log!).toBeLessThan(limit);
    expect(train.unheldGain).toBeUndefined();
    const atLimit = outcomeOf(pumpedTo(limit * (1 - 1e-6), moduleWith({ qSwitch: { repetitionRate: 10 } }, base)));
    expect(apart(figures.train.pulse_after_pause_energy_J!, atLimit.figures.pulse!.energy_J)).toBeLessThan(5e-6);
  });

  it('clamps every filling at a low rate', () => {
    const module = pumpedTo(2 * limit, moduleWith({ qSwitch: { repetitionRate: 500, opensAt: 2e-3 } }, base));
    const { figures, holdOffMargin } = outcomeOf(module);
    expect(apart(figures.state.round_trip_gain_log!, limit)).toBeLessThan(1e-12);
    expect(holdOffMargin!).toBeLessThan(0.51);
    expect(apart(figures.pulse!.energy_J, figures.train.pulse_after_pause_energy_J!)).toBeLessThan(1e-12);
  });

  it('is judged only where the file gives a closed loss', () => {
    expect(outcomeOf(moduleWith({})).holdOffMargin).toBeUndefined();
  });
});
