import { describe, expect, it } from 'vitest';
import { apart, moduleWith, outcomeOf, pulseOf } from './modules.ts';

describe('the gate', () => {
  const pulse = pulseOf(moduleWith({}));

  it('fails where it closes before the pulse has died', () => {
    const { figures, train } = outcomeOf(moduleWith({ qSwitch: { gate: pulse.build_up_time_s! } }));
    expect(figures.pulse).toBeUndefined();
    expect(figures.train).toEqual({ repetition_rate_Hz: 20 });
    expect(train.first).toBeUndefined();
    expect(figures.state.inversion_ratio).toBeGreaterThan(2);
  });

  it('lies between 2 and 6 widths after the peak at its shortest', () => {
    const gateOf = (widths: number) => pulse.build_up_time_s! + widths * pulse.width_fwhm_s;
    expect(outcomeOf(moduleWith({ qSwitch: { gate: gateOf(2) } })).figures.pulse).toBeUndefined();
    expect(pulseOf(moduleWith({ qSwitch: { gate: gateOf(6) } })).energy_J).toBe(pulse.energy_J);
  });

  it('that fails time after time lets the inversion pile up until one opening fires', () => {
    // At 2 kHz a lifetime spans many periods: what a failed opening leaves shortens the build-up of the next.
    const base = moduleWith({
      medium: { upperLevelLifetime: 5e-3 },
      pump: { duration: 200e-6, power: 300 },
      qSwitch: { repetitionRate: 2000 },
    });
    const open = outcomeOf(base);
    const short = outcomeOf(moduleWith({ qSwitch: { gate: 0.8 * open.train.first!.buildUp! } }, base));
    expect(short.train.first!.energy).toBeGreaterThan(1.2 * open.train.first!.energy);
    expect(short.figures.pulse!.build_up_time_s!).toBeLessThan(0.8 * open.train.first!.buildUp!);
    expect(short.figures.train.average_power_W!).toBeLessThanOrEqual(2000 * short.figures.pulse!.energy_J);
  });
});

describe('when the switch opens', () => {
  it('early, only the ions stored by then count', () => {
    const early = outcomeOf(moduleWith({ qSwitch: { opensAt: 120e-6 } })).figures;
    const shorter = outcomeOf(moduleWith({ pump: { duration: 120e-6 }, qSwitch: { opensAt: 120e-6 } })).figures;
    expect(early).toEqual(shorter);
    expect(early.state.stored_energy_J! / outcomeOf(moduleWith({})).figures.state.stored_energy_J!).toBeCloseTo(
      (1 - Math.exp(-120 / 230)) / (1 - Math.exp(-200 / 230)),
      9,
    );
  });

  it('late, the inversion has decayed', () => {
    const prompt = outcomeOf(moduleWith({})).figures;
    const late = outcomeOf(moduleWith({ qSwitch: { opensAt: 260e-6 } })).figures;
    expect(late.state.round_trip_gain_log! / prompt.state.round_trip_gain_log!).toBeCloseTo(Math.exp(-60 / 230), 9);
    expect(late.state.stored_energy_J! / prompt.state.stored_energy_J!).toBeCloseTo(Math.exp(-60 / 230), 9);
    expect(late.pulse!.energy_J).toBeLessThan(prompt.pulse!.energy_J);
  });

  it('below threshold, there is a state but no pulse', () => {
    const { figures } = outcomeOf(moduleWith({ pump: { power: 200 } }));
    expect(figures.pulse).toBeUndefined();
    expect(figures.state.inversion_ratio).toBeLessThan(1);
    expect(figures.state.extraction_efficiency).toBeUndefined();
    expect(figures.surfaces).toEqual([]);
  });

  it('below threshold at first, later openings fire on what the first ones left', () => {
    const base = moduleWith({
      medium: { upperLevelLifetime: 5e-3 },
      pump: { power: 130 },
      qSwitch: { repetitionRate: 1000, gate: 0.5e-3 },
    });
    const alone = outcomeOf(moduleWith({ qSwitch: { repetitionRate: 1 } }, base)).figures;
    expect(alone.state.inversion_ratio).toBeLessThan(1);
    expect(alone.pulse).toBeUndefined();
    const { figures, train } = outcomeOf(base);
    expect(train.first).toBeDefined();
    expect(figures.train.average_power_W).toBeGreaterThan(0);
  });
});

describe('storage under a pump pulse', () => {
  // Source: W. Koechner, Solid-State Laser Engineering, ch. 8: (τ/t_p)(1 − e^(−t_p/τ)) for a lifetime of 230 µs.
  it.each([
    [100e-6, 0.810968],
    [200e-6, 0.667996],
    [230e-6, 0.632121],
    [500e-6, 0.407683],
  ])('of %d s keeps the part %d', (duration, part) => {
    const module = moduleWith({ pump: { duration }, qSwitch: { opensAt: duration } });
    const pumped = 600 * 0.85 * 0.95 * duration * (808 / 1064);
    expect(outcomeOf(module).figures.state.stored_energy_J! / pumped).toBeCloseTo(part, 6);
  });

  it.each(['flat', 'gaussian'] as const)('counts all pumped area, whatever the beams: %s pump', (profile) => {
    const stored = 600 * 0.85 * 0.95 * 230e-6 * (1 - Math.exp(-200 / 230)) * (808 / 1064);
    for (const mode of ['flat', 'gaussian'] as const) {
      for (const reabsorbing of [false, true]) {
        const { figures } = outcomeOf(
          moduleWith({
            medium: reabsorbing ? { absorptionCrossSection: 3e-27, ionDensity: 1e26 } : {},
            pump: { beam: { profile, radius: 2e-3 } },
            resonator: { beam: { profile: mode, radius: 0.7e-3 } },
          }),
        );
        expect(apart(figures.state.stored_energy_J!, stored)).toBeLessThan(1e-12);
        expect(figures.state.extraction_efficiency!).toBeCloseTo(figures.pulse!.energy_J / stored, 12);
      }
    }
  });

  it('is rate times lifetime under a continuous pump at a low rate', () => {
    const { figures } = outcomeOf(
      moduleWith({ pump: { kind: 'continuous', power: 100 }, qSwitch: { repetitionRate: 20, opensAt: 0.05 } }),
    );
    expect(apart(figures.state.stored_energy_J!, 100 * 0.85 * 0.95 * 230e-6 * (808 / 1064))).toBeLessThan(1e-12);
  });
});
