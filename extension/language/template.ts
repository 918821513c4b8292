/** The text of a new design: complete, so that it predicts a pulse at once; the author replaces its figures. */
export function template(): string {
  return TEXT;
}

const TEXT = `# One gain module. Every figure here is an example: replace it by your own.
# Hover a key for what it does and what it moves; a tolerance is written like 600 W ± 3 %.
format: 1
title: New gain module

gain_medium:
  material: Nd:YAG # its properties come from the table; any of them can be given here
  length: 60 mm
  diameter: 5 mm

pump:
  kind: pulsed
  wavelength: 808 nm
  power: 600 W # optical power that reaches the medium, during the pulse
  duration: 200 us
  absorbed_fraction: 85 %
  beam: { profile: flat, radius: 1.7 mm }

resonator:
  length: 180 mm
  output_reflectivity: 50 %
  round_trip_loss: 6 % # all but the output coupler
  beam: { profile: gaussian, radius: 0.9 mm }

q_switch:
  kind: electro_optic
  closed_loss: 99.5 % # per round trip
  repetition_rate: 20 Hz

surfaces:
  - name: output coupler, inner face
    place: inside
    face: reflecting
    beam_radius: 0.9 mm
    damage_threshold: { fluence: 10 J/cm2, pulse_width: 10 ns, wavelength: 1064 nm }
    hot_spot_factor: 1.5
    safety_factor: 2

requirements:
  pulse_energy: { min: 8 mJ }
  pulse_width: { max: 12 ns }
`;
