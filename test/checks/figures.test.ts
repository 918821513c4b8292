import { describe, expect, test } from 'vitest';
import { designOf, findingsOf, messageOf, PLANCK, predictionOf, pulseOf, roundTrip, SPEED_OF_LIGHT } from './module.ts';

/** δ of a coupler of 50 % and a loss of 6 %. */
const LOSS = -Math.log(0.5 * 0.94);

/** m⁻²: ions that a flat pump of `power` W and 1.7 mm stores in 200 us, at 808 nm, 85 % absorbed, lifetime 230 us. */
function storedIons(power: number): number {
  const rate = (power * 0.85 * 808e-9) / (PLANCK * SPEED_OF_LIGHT);
  return (rate * 230e-6 * (1 - Math.exp(-200 / 230))) / (Math.PI * 1.7e-3 ** 2);
}

/** The same as round-trip log gain of a Gaussian mode of 0.9 mm. */
function storedGain(power: number): number {
  return 2 * 2.8e-23 * storedIons(power) * (1 - Math.exp(-2 * (1.7 / 0.9) ** 2));
}

describe('hold-off', () => {
  test('states the gain held, the gain stored and the loss needed', () => {
    const message = messageOf(designOf('hold-off'), 'hold-off');
    expect(message).toContain(`holds off a round-trip log gain of ${(LOSS - Math.log(0.4)).toPrecision(3)}`);
    expect(message).toContain(`would store ${storedGain(900).toPrecision(3)}`);
    const needed = 100 * (1 - Math.exp(LOSS - storedGain(900)));
    expect(message).toContain(`above ${Math.ceil(needed)} %`);
  });

  test.each([700, 900, 2000, 3500, 6000])('the loss it asks for holds at %d W, and a little less does not', (power) => {
    const at = (loss: string) =>
      designOf('hold-off', ['900 W', `${power} W`], ['closed_loss: 60 %', `closed_loss: ${loss} %`]);
    const needed = /closed loss above ([\d.]+) %/.exec(messageOf(at('30'), 'hold-off'))?.[1] ?? '';
    expect(findingsOf(at(needed), 'hold-off')).toEqual([]);
    const passed = 100 - Number(needed);
    expect(findingsOf(at(String(100 - 1.2 * passed)), 'hold-off')).toHaveLength(1);
  });
});

describe('no-pulse', () => {
  test('states gain, loss and the pump that would reach threshold', () => {
    const message = messageOf(designOf('no-pulse'), 'no-pulse');
    expect(message).toContain(`log gain is ${storedGain(200).toPrecision(3)}, the loss ${LOSS.toPrecision(3)}`);
    expect(message).toContain(`${(LOSS / storedGain(200)).toPrecision(3)} times the pump`);
    const reaching = (200 * LOSS) / storedGain(200);
    const at = (power: number) => designOf('no-pulse', ['200 W', `${power} W`]);
    expect(predictionOf(at(reaching * 0.999)).pulse).toBeUndefined();
    expect(predictionOf(at(reaching * 1.02)).pulse).toBeDefined();
  });

  test('blames the gate where the gain would do', () => {
    const text = designOf('no-pulse', ['200 W', '600 W'], ['repetition_rate', 'gate: 20 ns\n  repetition_rate']);
    const [finding] = findingsOf(text, 'no-pulse');
    expect(finding?.path).toBe('q_switch.gate');
    expect(finding?.message).toContain(`${(storedGain(600) / LOSS).toPrecision(3)} times the loss`);
    expect(finding?.message).toContain('closes again after 20.0 ns');
  });

  test('speaks of absorption where the medium still absorbs', () => {
    const text = designOf('no-pulse', ['length: 60 mm', 'wavelength: 946 nm\n  length: 60 mm'], ['200 W', '1 W']);
    expect(messageOf(text, 'no-pulse')).toContain('still absorbs at the laser wavelength');
    expect(messageOf(text, 'no-pulse')).toMatch(/log gain is -\d/);
  });

  test('blames the current of a diode stack', () => {
    const diode = 'diode: { current: 20 A, threshold_current: 12 A, slope_efficiency: 1 W/A, count: 7 }';
    const [finding] = findingsOf(designOf('no-pulse', ['power: 200 W', diode]), 'no-pulse');
    expect(finding?.path).toBe('pump.diode.current');
  });
});

describe('requirements', () => {
  test('a miss of more than the limit is told in whole percent', () => {
    const text = designOf('requirement-missed').replace('min: 15 mJ', 'max: 2 mJ');
    const percent = Math.round((pulseOf(text).energy_J / 2e-3 - 1) * 100);
    expect(percent).toBeGreaterThan(100);
    const messages = findingsOf(text, 'requirement-missed').map(({ message }) => message);
    expect(messages.join('\n')).toContain(`(${percent} %) above`);
  });

  test('a miss is told in its unit and in percent of the limit', () => {
    const text = designOf('requirement-missed');
    const { energy_J, width_fwhm_s } = pulseOf(text);
    const [energy, width] = findingsOf(text, 'requirement-missed').map(({ message }) => message);
    const short = (15e-3 - energy_J) * 1e6;
    expect(energy).toBe(
      `Predicted ${(energy_J * 1e3).toPrecision(3)} mJ: ${short.toPrecision(3)} µJ (${(short / 150).toPrecision(2)} %) below the minimum of 15.0 mJ.`,
    );
    const long = width_fwhm_s * 1e9 - 8;
    expect(width).toBe(
      `Predicted ${(long + 8).toPrecision(3)} ns: ${(long * 1e3).toPrecision(3)} ps (${((long / 8) * 100).toPrecision(2)} %) above the maximum of 8.00 ns.`,
    );
  });

  test('a limit met to the last digit is met', () => {
    const text = designOf('requirement-missed', ['min: 15 mJ', 'min: 1 mJ'], ['max: 8 ns', 'max: 9 ns']);
    expect(findingsOf(text, 'requirement-missed')).toEqual([]);
    expect(predictionOf(text).requirements.map(({ met }) => met)).toEqual([true, true, true, true]);
  });

  test('a margin cannot be judged without a closed loss, and the message asks for it', () => {
    const text = designOf('requirement-missed', ['  closed_loss: 99.5 %\n', '']);
    expect(messageOf(text, 'requirement-not-judged')).toMatch(/hold-off margin.*`q_switch.closed_loss`/);
  });
});

describe('timing', () => {
  test('a pump pulse longer than the period is blamed once', () => {
    const text = designOf('impossible-timing', ['  gate: 60 ms\n', ''], ['200 us', '60 ms'], ['600 W', '2 W']);
    expect(findingsOf(text, 'impossible-timing').map(({ path }) => path)).toEqual(['pump.duration']);
    expect(messageOf(text, 'impossible-timing')).toContain('(60.0 ms) is longer than the period of 50.0 ms');
  });

  test('the whole period fits', () => {
    expect(findingsOf(designOf('impossible-timing', ['60 ms', '50 ms']), 'impossible-timing')).toEqual([]);
  });

  test('pumping after the opening is told as time', () => {
    expect(messageOf(designOf('opens-before-pump-end'), 'opens-before-pump-end')).toContain('the last 20.0 µs');
    const early = pulseOf(designOf('opens-before-pump-end')).energy_J;
    const pumpCut = pulseOf(designOf('opens-before-pump-end', ['duration: 200 us', 'duration: 180 us'])).energy_J;
    expect(early / pumpCut).toBeCloseTo(1, 4);
  });

  test('the mean of an unsettled train is its average power over the rate', () => {
    const text = designOf('train-unsettled');
    const { average_power_W = 0 } = predictionOf(text).train;
    const mean = ((average_power_W / 60e3) * 1e6).toPrecision(3);
    expect(messageOf(text, 'train-unsettled')).toContain(`the mean is ${mean} µJ per opening`);
  });
});

describe('limits of the model', () => {
  test('round trips in a pulse', () => {
    const trips = pulseOf(designOf('few-round-trips')).width_fwhm_s / roundTrip(0.7, 0.06);
    expect(trips).toBeLessThan(4);
    expect(messageOf(designOf('few-round-trips'), 'few-round-trips')).toContain(
      `only ${trips.toPrecision(2)} round trips`,
    );
  });

  test('build-up and pulse against the lifetime', () => {
    const { width_fwhm_s, build_up_time_s = 0 } = pulseOf(designOf('long-pulse'));
    const part = (100 * (width_fwhm_s + build_up_time_s)) / 230e-6;
    expect(messageOf(designOf('long-pulse'), 'long-pulse')).toContain(`take ${part.toPrecision(2)} %`);
  });

  test('a slow opening is blamed for a long build-up', () => {
    const slow = ['repetition_rate', 'opening_time: 20 us\n  repetition_rate'] as const;
    const text = designOf('no-pulse', ['200 W', '400 W'], slow);
    expect(findingsOf(text, 'long-pulse').map(({ path }) => path)).toEqual(['q_switch.opening_time']);
  });

  test('photon lifetime against the lower level', () => {
    const photon = (roundTrip(0.05, 0.02) / LOSS) * 1e12;
    const message = messageOf(designOf('lower-level-bottleneck'), 'lower-level-bottleneck');
    expect(message).toContain(`a photon in the resonator ${10 * Math.round(photon / 10)} ps`);
    const given = designOf('lower-level-bottleneck', [
      'length: 20 mm',
      'lower_level_lifetime: 200 ps\n  length: 20 mm',
    ]);
    expect(findingsOf(given, 'lower-level-bottleneck')).toEqual([]);
  });

  test('ions excited over ions there', () => {
    const ratio = storedIons(600) / (1e24 * 0.02);
    expect(messageOf(designOf('too-many-excited'), 'too-many-excited')).toContain(
      `${ratio.toPrecision(3)} times the ions`,
    );
    expect(findingsOf(designOf('too-many-excited', ['1e18', '1.6e18']), 'too-many-excited')).toEqual([]);
  });

  test('the part of a beam outside the medium, flat and Gaussian', () => {
    const flat = 100 * (1 - (1.5 / 1.7) ** 2);
    expect(messageOf(designOf('beam-beyond-medium'), 'beam-beyond-medium')).toContain(
      `${flat.toPrecision(2)} % of the pump`,
    );
    const text = designOf('beam-beyond-medium', ['3 mm', '2.6 mm']);
    const gaussian = 100 * Math.exp(-2 * (1.3 / 0.9) ** 2);
    expect(findingsOf(text, 'beam-beyond-medium').map(({ path }) => path)).toEqual([
      'pump.beam.radius',
      'resonator.beam.radius',
    ]);
    expect(findingsOf(text, 'beam-beyond-medium')[1]?.message).toContain(
      `${gaussian.toPrecision(2)} % of the laser mode`,
    );
  });
});
