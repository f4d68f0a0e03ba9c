/** What every reader of a result should know. */
export const cautions: readonly string[] = [
  'Grains are homogeneous spheres, or the stated mixture. Irregular grains change beta by tens of per cent, more near resonances.',
  'Charge is left out of the fates: below about 0.1 µm near the Sun the Lorentz force rules, and fates from beta alone are indicative there.',
  'Surroundings are optically thin: no shadowing, no gas drag, no planets.',
  'Stars shine as black bodies unless a spectrum is given. That is wrong in the ultraviolet of hot stars and in the bands of cool ones, worth up to tens of per cent in Q_pr around 0.1 µm.',
  'Grains are released without relative speed from a body on a Keplerian orbit. Ejected or interstellar grains need their own velocities.',
  'Luminosity and mass are constant; no flares. The wind is off unless given.',
  'Blow-out is a dynamical limit, not an observed smallest size: sizes fitted to discs exceed it by factors of one to ten.',
  'Collision times are orders of magnitude.',
  'Sizes near a detection limit bias every share: the completeness of a catalogue is its maker’s responsibility.',
  'Below about 5 nm the optical constants of bulk matter are doubtful.',
  'The geometric answer (Q_pr = 1) is a comparison, not a result, for radii below about 3 µm.',
  'Results are research estimates, not a spacecraft impact-hazard assessment: for that, follow the applicable standards and a qualified analyst.',
];
