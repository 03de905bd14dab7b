/** What derived quantities assume; told once where they are in force. */
export const says = {
  flowAtBulk: 'Mass and volume flow are converted by the density at bulk temperature.',
  spheres: 'Particles are taken as spheres where no sphericity is given.',
  bubbles: 'The interfacial area is that of spherical bubbles of one diameter, per volume of clear liquid.',
  flatBottom: 'The liquid volume is that of an upright cylinder with a flat bottom.',
  roundBore: (quantity: string): string => `The flow is taken to fill a round cross section of the given ${quantity}.`,
  annulus: 'The stream runs in an annulus between the bore `diameter` and the inner tube `outer_diameter`.',
  wideSlit: 'The channel is taken as a slit that is wide against its gap.',
  mantle: (quantity: string): string => `The area of transfer is the mantle of one tube: pi times ${quantity} times length.`,
  oneSphere: 'The area of transfer is the surface of one sphere.',
  wholePacking: 'The area of transfer is the whole surface of the packing.',
  longCylinder: 'The cylinder is taken as long: its ends are left out of V/A.',
  wettedAllRound: 'The mass flow runs as a film that wets the bore all round.',
  notGassed: 'The shaft power is taken as that without gas.',
  gassedTurbine:
    'The power under gas is estimated for one disk turbine of standard proportions (Hughmark 1980, within about 12 %); a measured power goes before it.',
  gasIsOther: 'The gas is the second stream; its flow is counted at the conditions of the vessel.',
  gasIsOnlyFlow: 'The only flow given is taken as that of the gas, at the conditions of the vessel.',
  meanRate: 'The rate is the mean over the run: mass lost over time.',
} as const;
