/** A valid design of 300 lines: the demo's kind of module with many surfaces, comments and private keys. */
export function longDesign(): string {
  const surfaces = Array.from({ length: 24 }, (_, i) => surface(i)).flat();
  const notes = Array.from({ length: 22 }, (_, i) => note(i)).flat();
  return `${[...HEAD, ...surfaces, '', ...REQUIREMENTS, '', 'x-notes:', ...notes].slice(0, 300).join('\n')}\n`;
}

const HEAD = `# Transmitter with every surface that its beam meets.
format: 1
title: Transmitter, all surfaces

gain_medium:
  material: Nd:YAG
  wavelength: 1064 nm
  length: 60 mm
  diameter: 5 mm
  emission_cross_section: 2.8e-19 cm2   # measured
  upper_level_lifetime: 230 us
  inversion_reduction_factor: 1
  refractive_index: 1.82

pump:
  kind: pulsed
  wavelength: 808 nm
  power: 600 W ± 3 %
  duration: 200 us
  absorbed_fraction: 85 %
  quantum_efficiency: 0.95
  beam: { profile: flat, radius: 1.7 mm }

resonator:
  length: 180 mm ± 0.5 mm
  output_reflectivity: 50 % ± 2 %
  round_trip_loss: 6 %
  beam: { profile: gaussian, radius: 0.9 mm }

q_switch:
  kind: electro_optic
  closed_loss: 99.5 %
  opens_at: 200 us
  gate: 10 us
  repetition_rate: 20 Hz

surfaces:`.split('\n');

const REQUIREMENTS = `requirements:
  pulse_energy: { min: 8 mJ, max: 14 mJ }
  pulse_width: { max: 12 ns }
  peak_power: { min: 0.7 MW }
  average_power: { min: 150 mW }`.split('\n');

function surface(i: number): string[] {
  return [
    `  # Element ${i + 1}, coated in batch ${i % 5}`,
    `  - name: window ${i + 1}`,
    `    place: ${i % 3 === 0 ? 'inside' : 'outside'}`,
    `    beam_radius: ${(2 + i / 20).toFixed(2)} mm`,
    `    damage_threshold: { fluence: ${20 + i} J/cm2, pulse_width: 10 ns, wavelength: 1064 nm }`,
    '    hot_spot_factor: 1.5   # camera, 200 shots',
    '    safety_factor: 2',
  ];
}

function note(i: number): string[] {
  return [
    `  - part: P-${1000 + i}`,
    '    # weighed and measured on delivery',
    `    by: ${i % 2 === 0 ? 'bench A' : 'bench B'}`,
    `    length: ${10 + i}`,
  ];
}
