import { describe, expect, test } from 'vitest';
import { designOf, findingsOf, messageOf, predictionOf, pulseOf } from './module.ts';

/** J/cm2: incident on the coupler (R = 50 %) under a Gaussian beam of `radius` in cm. */
function incident(energy: number, radius: number): number {
  return (2 * energy) / (Math.PI * radius ** 2) / (1 - 0.5);
}

/** J/cm2: 10 J/cm2 at 10 ns, scaled to a shorter pulse by the square root of time. */
function scaled(width: number): number {
  return 10 * Math.sqrt(width / 10e-9);
}

describe('margin of a surface', () => {
  test('past the threshold', () => {
    const text = designOf('fluence-over-threshold');
    const { energy_J, width_fwhm_s } = pulseOf(text);
    const fluence = incident(energy_J, 0.04);
    const threshold = scaled(width_fwhm_s);
    const margin = Math.floor((1000 * threshold) / (fluence * 1.5)) / 1000;
    expect(messageOf(text, 'fluence-over-threshold')).toBe(
      `Damage expected, margin ${margin.toPrecision(3)}: peak fluence ${fluence.toPrecision(3)} J/cm2 times a hot-spot factor of 1.5 against a threshold of ${threshold.toPrecision(3)} J/cm2 at ${(width_fwhm_s * 1e9).toPrecision(3)} ns. Enlarge the beam here, lower the energy, or choose a coating with a higher threshold.`,
    );
  });

  test('short of the wanted safety factor', () => {
    const text = designOf('fluence-near-threshold');
    const { energy_J, width_fwhm_s } = pulseOf(text);
    const margin = Math.floor((100 * scaled(width_fwhm_s)) / (incident(energy_J, 0.06) * 1.5)) / 100;
    expect(messageOf(text, 'fluence-near-threshold')).toContain(`Margin ${margin.toPrecision(3)}, wanted 2:`);
  });

  test('the pulse after a pause, by its own energy', () => {
    const text = designOf('fluence-after-pause');
    const { pulse_after_pause_energy_J: energy = Number.NaN } = predictionOf(text).train;
    const fluence = (2 * energy) / (Math.PI * 0.045 ** 2) / (1 - 0.8);
    expect(messageOf(text, 'fluence-after-pause')).toContain(`peak fluence ${fluence.toPrecision(3)} J/cm2 against`);
    expect(
      findingsOf(designOf('fluence-after-pause', ['safety_factor: 3', 'safety_factor: 1']), 'fluence-after-pause'),
    ).toEqual([]);
    const settledToo = designOf('fluence-after-pause', ['safety_factor: 3', 'safety_factor: 20']);
    expect(findingsOf(settledToo, 'fluence-after-pause')).toEqual([]);
    expect(findingsOf(settledToo, 'fluence-near-threshold')).toHaveLength(1);
  });

  test('a margin just short of 1 is an error that does not read 1.00', () => {
    const { margin = 0 } = predictionOf(designOf('fluence-near-threshold')).surfaces[0] ?? {};
    const at = (wanted: number) =>
      designOf('fluence-near-threshold', ['fluence: 10 J/cm2', `fluence: ${(10 * wanted) / margin} J/cm2`]);
    expect(messageOf(at(0.9997), 'fluence-over-threshold')).toContain('margin 0.999:');
    expect(findingsOf(at(1.0003), 'fluence-over-threshold')).toEqual([]);
    expect(messageOf(at(1.0003), 'fluence-near-threshold')).toContain('Margin 1.00, wanted 2:');
    expect(messageOf(at(1.9999), 'fluence-near-threshold')).toContain('Margin 1.99, wanted 2:');
    expect(findingsOf(at(2.0001), 'fluence-near-threshold')).toEqual([]);
  });

  test('a transmitting face inside bears both directions, a surface outside the leaving beam alone', () => {
    const surface = (text: string) => predictionOf(text).surfaces[0]?.peak_fluence_J_per_cm2 ?? 0;
    const { energy_J } = pulseOf(designOf('fluence-near-threshold'));
    const leaving = (2 * energy_J) / (Math.PI * 0.06 ** 2);
    const transmitting = designOf('fluence-near-threshold', ['face: reflecting', 'face: transmitting']);
    expect(surface(transmitting) / leaving).toBeCloseTo((1 + 0.5) / (1 - 0.5), 10);
    const outside = designOf('fluence-near-threshold', ['place: inside', 'place: outside']);
    expect(surface(outside) / leaving).toBeCloseTo(1, 10);
  });

  test('no hot-spot factor is spoken of where there is none', () => {
    const text = designOf('fluence-over-threshold', ['    hot_spot_factor: 1.5\n', '']);
    expect(messageOf(text, 'fluence-over-threshold')).not.toContain('hot-spot');
  });

  test('towards longer pulses the threshold grows with the exponent 0.3', () => {
    const text = designOf('fluence-near-threshold', ['pulse_width: 10 ns', 'pulse_width: 1 ns']);
    const { width_fwhm_s } = pulseOf(text);
    const { threshold_J_per_cm2 = 0 } = predictionOf(text).surfaces[0] ?? {};
    expect(threshold_J_per_cm2 / (10 * (width_fwhm_s / 1e-9) ** 0.3)).toBeCloseTo(1, 10);
  });
});

describe('conditions of a threshold', () => {
  const near = (change: readonly [string, string]) =>
    findingsOf(designOf('fluence-near-threshold', change), 'threshold-conditions');

  test('wavelengths up to 5 % apart pass', () => {
    expect(near(['wavelength: 1064 nm }', 'wavelength: 1110 nm }'])).toEqual([]);
    expect(near(['wavelength: 1064 nm }', 'wavelength: 1120 nm }'])[0]?.severity).toBe('warning');
    expect(near(['wavelength: 1064 nm }', 'wavelength: 1005 nm }'])[0]?.message).toContain('measured at 1005 nm');
  });

  test('pulse widths from 50 ps to 100 ns pass, below 20 ps nothing is scaled', () => {
    const at = (width: string) => near(['pulse_width: 10 ns', `pulse_width: ${width}`]).map(({ severity }) => severity);
    expect(at('100 ns')).toEqual([]);
    expect(at('101 ns')).toEqual(['information']);
    expect(at('50 ps')).toEqual([]);
    expect(at('49 ps')).toEqual(['information']);
    expect(at('20 ps')).toEqual(['information']);
    expect(at('19 ps')).toEqual(['warning']);
    const refused = designOf('fluence-near-threshold', ['pulse_width: 10 ns', 'pulse_width: 19 ps']);
    expect(predictionOf(refused).surfaces[0]).not.toHaveProperty('margin');
    expect(messageOf(refused, 'threshold-conditions')).toMatch(/^No margin: the threshold is for 19.0 ps/);
  });
});
