import { choice, quantity } from './define'

/** The canoe body, without keel and rudder. */
export const hullParameters = {
  lengthOverall: quantity({ label: 'Length overall', symbol: 'L_OA', unit: 'm', min: 4, max: 16, step: 0.05, default: 8.6, source: 'Measured' }),
  waterlineLength: quantity({ label: 'Waterline length', symbol: 'L_WL', unit: 'm', min: 3.5, max: 15, step: 0.05, default: 7, source: 'Measured' }),
  beamOverall: quantity({ label: 'Beam', symbol: 'B', unit: 'm', min: 1.4, max: 5, step: 0.05, default: 2.5, source: 'Measured' }),
  waterlineBeam: quantity({ label: 'Waterline beam', symbol: 'B_WL', unit: 'm', min: 1.2, max: 4.6, step: 0.05, default: 2.2, source: 'About .88 of the beam, estimate' }),
  canoeBodyDraught: quantity({ label: 'Draught of the canoe body', symbol: 'T_c', unit: 'm', min: 0.15, max: 1.4, step: 0.01, default: 0.55, source: 'Measured, or from displacement by the block coefficient' }),
  displacement: quantity({ label: 'Displacement', symbol: 'm', unit: 'kg', min: 500, max: 16000, step: 10, default: 3600, source: 'Weighed, sailing trim' }),
  wettedArea: quantity({ label: 'Wetted area of the canoe body', symbol: 'S_c', unit: 'm2', min: 4, max: 50, step: 0.1, default: 14, source: 'Gerritsma, Keuning & Onnink 1992, regression for wetted area' }),
  centreOfGravityX: quantity({ label: 'Centre of gravity, forward of the rudder stock', symbol: 'x_G', unit: 'm', min: 1, max: 8, step: 0.05, default: 3.4, source: 'Near the centre of buoyancy, estimate' }),
  bowX: quantity({ label: 'Stem, forward of the rudder stock', symbol: 'x_bow', unit: 'm', min: 3, max: 16, step: 0.05, default: 8.1, source: 'Measured' }),
  freeboard: quantity({ label: 'Deck above the waterline', symbol: 'F', unit: 'm', min: 0.4, max: 2, step: 0.05, default: 0.9, source: 'Measured' }),
  metacentricHeight: quantity({ label: 'Metacentric height', symbol: 'GM', unit: 'm', min: 0.3, max: 2.5, step: 0.01, default: 0.9, source: 'Inclining test, or estimate from beam and ballast', effect: 'Stiffer: heels less' }),
  vanishingAngleDeg: quantity({ label: 'Angle of vanishing stability', symbol: 'phi_v', unit: 'deg', min: 90, max: 175, step: 1, default: 130, source: 'Estimate for ballasted cruisers' }),
  yawRadiusRatio: quantity({ label: 'Yaw gyradius over length', symbol: 'k_zz/L', unit: '1', min: 0.18, max: 0.34, step: 0.005, default: 0.25, source: 'Common value .25 L_OA, from memory' }),
  rollRadiusRatio: quantity({ label: 'Roll gyradius over beam', symbol: 'k_xx/B', unit: '1', min: 0.25, max: 0.6, step: 0.01, default: 0.4, source: 'Common value .35 to .45 B with the rig, from memory' }),
  rollDampingRatio: quantity({ label: 'Roll damping, bare hull', symbol: 'zeta_phi', unit: '1', min: 0.01, max: 0.3, step: 0.01, default: 0.05, source: 'Estimate; keel, rudder and sails add their own' }),
  residuaryFactor: quantity({ label: 'Wave-making resistance against the series mean', symbol: 'f_R', unit: '1', min: 0.6, max: 2, step: 0.05, default: 1, source: 'Delft series 1981, mean of 22 hulls' }),
  heelYawArm: quantity({ label: 'Yaw of the heeled hull, lever over length', symbol: 'c_phi', unit: '1', min: 0, max: 0.05, step: 0.001, default: 0.012, source: 'Estimate: resistance of the heeled hull acts to leeward of the keel line', effect: 'More weather helm with heel' }),
} as const

export const keelParameters = {
  kind: choice({ label: 'Keel', options: { long: 'Long keel', fin: 'Fin keel', lifting: 'Lifting keel' }, default: 'long', source: 'Measured' }),
  area: quantity({ label: 'Keel area, one side', symbol: 'A_k', unit: 'm2', min: 0.2, max: 10, step: 0.05, default: 2.6, source: 'Measured' }),
  span: quantity({ label: 'Keel depth below the canoe body', symbol: 'b_k', unit: 'm', min: 0.2, max: 2.5, step: 0.05, default: 0.8, source: 'Measured' }),
  x: quantity({ label: 'Keel lift, forward of the rudder stock', symbol: 'x_k', unit: 'm', min: 0.5, max: 8, step: 0.05, default: 3.4, source: 'Quarter chord at mid span', effect: 'Further forward: more lee helm taken away' }),
  sweepDeg: quantity({ label: 'Keel sweep', symbol: 'Lambda_k', unit: 'deg', min: 0, max: 60, step: 1, default: 20, source: 'Measured at the quarter chord' }),
} as const

export const rudderParameters = {
  kind: choice({ label: 'Rudder', options: { 'keel-hung': 'Hung on the keel', skeg: 'On a skeg', spade: 'Free-standing blade', outboard: 'Outboard, on the transom' }, default: 'keel-hung', source: 'Measured' }),
  area: quantity({ label: 'Rudder area', symbol: 'A_r', unit: 'm2', min: 0.08, max: 1.2, step: 0.01, default: 0.36, source: 'Measured' }),
  span: quantity({ label: 'Rudder depth', symbol: 'b_r', unit: 'm', min: 0.3, max: 2, step: 0.05, default: 0.95, source: 'Measured' }),
  balance: quantity({ label: 'Balance: part of the chord ahead of the stock', symbol: 'b_f', unit: '1', min: 0, max: 0.25, step: 0.01, default: 0, source: 'Measured', effect: 'Lighter tiller' }),
  stopDeg: quantity({ label: 'Tiller stops', symbol: 'delta_max', unit: 'deg', min: 15, max: 60, step: 1, default: 35, source: 'Measured' }),
  friction: quantity({ label: 'Friction in the rudder bearings', symbol: 'Q_f', unit: 'Nm', min: 0, max: 40, step: 0.1, default: 1.5, source: 'Estimate; measure with a spring balance at the tiller', effect: 'Wanders more, and needs more wind to hold' }),
  inertia: quantity({ label: 'Rudder and tiller inertia with entrained water', symbol: 'I_r', unit: 'kgm2', min: 0.5, max: 60, step: 0.1, default: 4, source: 'Estimate: blade as a plate with the water cylinder on its chord' }),
  speedRatio: quantity({ label: 'Water speed at the rudder', symbol: 'k_u', unit: '1', min: 0.6, max: 1.1, step: 0.01, default: 0.9, source: 'Gerritsma 1971: about .9 behind a keel, from memory' }),
  leewayRatio: quantity({ label: 'Leeway the rudder sees', symbol: 'k_v', unit: '1', min: 0.2, max: 1, step: 0.05, default: 0.5, source: 'Gerritsma 1971: about half behind a keel, from memory' }),
} as const

export const tillerParameters = {
  length: quantity({ label: 'Tiller length', symbol: 'l_t', unit: 'm', min: 0.4, max: 2.5, step: 0.05, default: 1.15, source: 'Measured' }),
  height: quantity({ label: 'Tiller above the waterline', symbol: 'z_t', unit: 'm', min: 0.3, max: 2.2, step: 0.05, default: 1, source: 'Measured' }),
} as const
