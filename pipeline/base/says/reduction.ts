const n = (x: number, digits = 3): string => (Number.isFinite(x) ? `${Number(x.toPrecision(digits))}` : 'no number');
const percent = (x: number): string => `${n(100 * x, 2)} %`;
const celsius = (T: number): string => `${Number((T - 273.15).toFixed(2))} degC`;

/** What reduction routes assume (told once) and what their checks find (told per trial). Temperatures come in K, shares as shares of 1. */
export const says = {
  // any route
  uncertainDifference: (what: string, unit: string, x: number, u: number): string =>
    `${what} of ${n(Math.abs(x))}${unit} is known only to ${n(u, 2)}${unit} (standard uncertainty, ${percent(u / Math.abs(x))}); the coefficient is no better`,
  noDifference: (what: string): string => `${what} is zero, so no coefficient can be had from this trial`,
  uncertainResult: (what: string, x: number, u: number): string =>
    `${what} is known only within ${percent(u / Math.abs(x))} (standard uncertainty)`,

  // heat balances
  noLoss: 'No heat loss is stated; none is taken off.',
  lossByConductance: 'The heat loss is loss_conductance times the excess over ambient temperature.',
  noRadiation: 'No emissivity is stated; radiation is not taken off.',
  surroundingsLikeFluid:
    'Radiation is exchanged with surroundings at the temperature of the fluid, since ambient_temperature is not given.',
  largeLoss: (share: number): string => `losses are ${percent(share)} of the heat rate: the coefficient rests on how well they are known`,
  lossesExceed: (q: number, loss: number): string => `losses of ${n(loss)} W leave nothing of the heat rate of ${n(q)} W`,
  heatAgainstDifference: (q: number, dT: number): string =>
    `heat_rate is ${n(q)} W (positive: into the fluid), but the wall is ${n(Math.abs(dT))} K ${dT < 0 ? 'colder' : 'warmer'} than the fluid; its magnitude is used`,
  temperaturesCross: (a: number, b: number): string =>
    `the temperature differences at the two ends, ${n(a)} K and ${n(b)} K, do not have one sign: no log-mean difference exists`,
  awayFromWall: (inlet: number, outlet: number, wall: number): string =>
    `the stream goes from ${celsius(inlet)} to ${celsius(outlet)}, away from the wall at ${celsius(wall)}`,
  nearEquilibrium: (left: number): string =>
    `only ${percent(left)} of the inlet difference is left at the outlet: a small error there is a large one in the coefficient`,
  dutyAgainstDifference: (q: number): string =>
    `the duty comes out as ${n(q)} W from the hotter to the colder stream: one of the flows or temperatures is wrong, or the streams are swapped`,
  imbalance: (share: number, u: number): string =>
    u > 0
      ? `heat balance open by ${percent(share)} (own against other duty), ${n(Math.abs(share) / u, 2)} times its standard uncertainty of ${percent(u)}`
      : `heat balance open by ${percent(share)} (own against other duty); no uncertainty is stated that it could be judged by`,
  imbalanceTooLarge: (share: number, u: number, balance: number): string =>
    u > 0
      ? `heat balance open by ${percent(share)}, ${n(Math.abs(share) / u, 2)} times its standard uncertainty: beyond 4 times a trial is refused unless a heat loss is stated`
      : `heat balance open by ${percent(share)}: beyond ${percent(balance)} a trial is refused (setting balance)`,
  noBalance: "One stream's duty cannot be had, so the heat balance is not tested.",
  equalWeights: 'The two duties count equally: no uncertainty of flows or temperatures is stated to weigh them by.',
  bothUnmixed: 'Cross flow is taken as one pass with both streams unmixed.',
  outletIsContents: 'The well-stirred stream is at its outlet temperature throughout.',
  noCrossFlow: (P: number, R: number): string =>
    `effectiveness ${n(P)} at a capacity ratio of ${n(R)} cannot be reached in cross flow: one of the temperatures is wrong, or the flow is not cross flow`,
  tubeArea: (quantity: string): string => `The area of transfer is pi times ${quantity} times length, one tube.`,

  // resistances
  noFouling: 'No fouling_resistance is stated; none is taken off.',
  flatWall: 'The wall is taken as flat: no pair of diameters is given.',
  noWall: 'The resistance of the wall is left out: wall_conductivity or its thickness is not given.',
  wallByResistances: 'The wall temperature on the own side follows from the resistances in series.',
  smallShare: (share: number): string =>
    `the wanted resistance is ${percent(share)} of the whole: under 30 % its error is more than three times that of the overall coefficient`,
  nothingLeft: (whole: number, others: number): string =>
    `the other resistances, ${n(others)} m^2 K/W, are more than the whole, ${n(whole)} m^2 K/W`,

  // bodies
  lumped:
    'The body is taken at one temperature (lumped): solid_conductivity is not given, so its inner resistance and Bi cannot be checked.',
  exactSeries: (body: string): string =>
    `The exact series of a ${body} with constant coefficient is used, which at small Bi is the lumped form.`,
  fluidIsAmbient: 'The surroundings at ambient_temperature are the fluid.',
  meanSurface: 'Wall temperature is the mean of the temperatures at start and end.',
  longBody: (body: string): string =>
    `The ${body} is taken as large against its ${body === 'slab' ? 'thickness, cooled from both sides' : 'diameter'}.`,
  fasterThanConduction: (theta: number): string =>
    `the remaining difference, ${percent(theta)} of the first, is less than conduction inside the body allows even without any resistance outside: no coefficient can be had`,
  noProgress: (theta: number): string => `the remaining difference is ${percent(theta)} of the first; it must lie between 0 and 100 %`,
  insideGoverns: (bi: number): string =>
    `Bi = ${n(bi)} on V/A: the resistance is mainly inside the body, and this trial says little of the coefficient outside`,
  rateBeyondConduction: (rate: number): string =>
    `the curve dies away at ${n(rate)} 1/s, faster than conduction inside the body allows even without any resistance outside: no coefficient can be had`,
  earlyWindow: (fo: number): string =>
    `the curve is read from Fo = ${n(fo)} (on the half thickness or radius) on; before 0.2 it is not yet one exponential`,

  // logged curves
  shortCurve: (points: number, fewest: number): string => `the curve has ${points} points in its window; ${fewest} or more are needed`,
  noBath: (keys: readonly string[]): string =>
    `the curve needs the temperature it approaches as a column or value of the trial: ${keys.join(' or ')}`,
  noRate: (bath: number): string => `the curve does not approach ${celsius(bath)} as an exponential whose rate its window determines`,
  correlatedResiduals: (lag1: number, widening: number, sd: number): string =>
    `the curve's residuals (${n(sd, 2)} K) hang together (lag-1 correlation ${n(lag1, 2)}): its uncertainty is widened ${n(widening, 2)} times, and one exponential may not hold`,

  noGassingRate: (tau: number): string =>
    `the curve does not determine kLa${tau > 0 ? ` behind a probe of ${n(tau)} s` : ''}: it is too short, over at once, or not an approach to saturation`,
  noLag: 'The probe is taken as instantaneous: probe_time is not given. A probe that is slow against kLa makes it read low.',
  stepAtStart: 'The window begins with the step of the gas, liquid and probe in equilibrium before it.',
  slowProbe: (kLa: number, tau: number): string =>
    `kLa times probe time is ${n(kLa * tau)}: the probe is slower than the transfer, and an error in its time constant is a large one in kLa`,
  noPermeation: 'the curve has no slope: nothing comes through in its window',
  notYetSteady: (from: number, lag: number): string =>
    `the window begins at ${n(from)} s, less than twice the time lag of ${n(lag)} s: permeation is not yet steady there, and rate and lag read low`,

  // vessels
  noLossConductance: 'No loss_conductance is stated; none is taken off.',
  noConstantLoss: 'No constant heat_loss is stated; none is taken off.',
  ambientMissing: 'loss_conductance is given, but not the ambient_temperature that it counts from',
  noEquipmentHeat: 'No equipment_heat_capacity is stated; the vessel itself is left out of the heat balance.',
  timeMean: 'Bulk temperature is the mean over time of an exponential approach.',
  beyondJacket: (start: number, end: number, jacket: number): string =>
    `contents going from ${celsius(start)} to ${celsius(end)} do not approach a jacket at ${celsius(jacket)}`,
  jacketSpent: (share: number): string =>
    `the jacket stream gives up ${percent(share)} of what it could: its flow, more than the coefficient, sets the rate`,

  // mass
  rateByMolarMass: 'Rates by mass and concentrations by amount (or the other way round) are matched by molar_mass.',
  noApproach: (a: number, b: number, s: number): string =>
    `concentration going from ${n(a)} to ${n(b)} does not approach saturation at ${n(s)} from one side`,
  constantFlow: 'The volume flow is taken as constant along the wall.',
  shortBed: (lengths: number): string =>
    `the bed is ${n(lengths, 2)} particle diameters long: below 20, axial mixing and end effects make the coefficient read low`,
  pinched: (share: number, ratio: number): string =>
    `${percent(share)} of the inlet difference left at a flow ratio S of ${n(ratio)} cannot be reached in counter flow: a flow, a concentration or the equilibrium is wrong`,
  overallOnSide: (side: string): string => `The coefficient is overall, on the ${side} side, per volume of packing.`,
  wholeArea: 'The whole surface of the packing is taken as wetted.',
  noMigration: 'Migration of the ion in the electric field is left out: supporting electrolyte in excess.',
  vapourAtSurface: 'vapour_pressure is that at the surface.',
  dryGas: 'The gas is taken as free of the vapour: neither relative_humidity nor bulk_concentration is given.',
  atmospheric: 'The total pressure is taken as 101.325 kPa: pressure is not given.',
  filmConcentration: 'Concentrations of the vapour are counted at film temperature.',
  boils: (surface: number, total: number): string =>
    `the vapour pressure at the surface, ${n(surface)} Pa, is not below the total pressure of ${n(total)} Pa: the liquid would boil`,
  evaporationBackwards: (rate: number, surface: number, bulk: number): string =>
    `${rate > 0 ? 'mass is lost' : 'mass is gained'}, but the vapour pressure is ${n(surface)} Pa at the surface and ${n(bulk)} Pa in the gas`,
  highFlux: (factor: number): string =>
    `the flow of vapour itself carries ${percent(Math.abs(factor - 1))} ${factor > 1 ? 'more' : 'less'} than diffusion alone; it is taken out`,
  noSolute: (quantity: string): string => `${quantity} is not given and taken as zero.`,
  byMolarMass: 'Concentrations by amount are turned into mass by molar_mass.',
  constantBulk: "The liquid's concentration is taken as constant: liquid_volume is not given.",
  risingBulk: "The liquid's concentration rises with what dissolves into liquid_volume; bulk_concentration is that at the start.",
  sphericalPellets: 'Particles are taken as spheres: sphericity is not given.',
  notUndersaturated: (s: number, b: number): string =>
    `saturation_concentration ${n(s)} is not above bulk_concentration ${n(b)}: nothing dissolves`,
  shrunk: (share: number): string =>
    `the diameter has shrunk to ${percent(share)} of that at the start: the coefficient is a mean over sizes`,
  dissolvedShare: (share: number): string =>
    `${percent(share)} of the mass is lost; it must lie between 0 and 100 %${share >= 1 ? ': what is gone altogether gives only a lower bound' : ''}`,
  nearSaturation: (share: number): string => `the liquid ends at ${percent(share)} of the way to saturation`,
  saturates: 'What dissolves would saturate the liquid before it has dissolved: mass, volume and saturation do not fit together.',
  // layers
  oneSideFree: (side: string): string => `No coefficient is given on the ${side} side of the layer; it has no resistance there.`,
  sidesFree: 'No coefficients are given on the two sides of the layer; they have no resistance.',
  layerHasNone: (whole: number, sides: number): string =>
    `the resistances on both sides, ${n(sides)} s/m, are more than the whole, ${n(whole)} s/m`,
  onePhase: 'partition_coefficient is not given and taken as one: concentrations count inside the layer.',
  insideLayer: 'Sh of the layer is on concentrations inside it, for which steady diffusion has Sh = 1.',
  coefficientIsLayer: 'The coefficient is that through the layer (with the other side, where given), on concentrations in the fluid.',

  // other side
  otherSideConstant:
    'All resistances but that of the law are one constant within a campaign: the other side must be held at the same flow and temperatures, and fouling must not grow.',
} as const;
