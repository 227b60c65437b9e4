import { DEGREE, GRAVITY } from '../constants'
import { FOIL_DRAG, liftSlope, turnDamping } from '../foils/section'
import { addedMass, keelAddedMass } from '../hull/added-mass'
import { HIGHEST_FROUDE, hullResistance } from '../hull/resistance'
import type { Plan } from '../plan/types'
import { type ControlLine, controlLineOf } from './control-line'
import { type VesselSail, vesselSail } from './vessel-sail'

/** Spacing of the resistance table, m/s. */
const SPEED_STEP = 0.05

/** A plan turned into the numbers the derivative needs: SI, body frame, on the tack sailed. */
export interface Vessel {
  /** +1 on the starboard tack, -1 on port. */
  tack: 1 | -1
  mass: number
  surgeMass: number
  swayMass: number
  /** Added mass of the keel alone, part of swayMass, kg. */
  keelMass: number
  rollInertia: number
  yawInertia: number
  munkMass: number
  gm: number
  vanishing: number
  rollDamping: number
  length: number
  draught: number
  /** Upright resistance, N, at multiples of speedStep. */
  resistance: Float64Array
  speedStep: number
  heelYawLever: number
  keel: Foil & {
    /** Where its incidence is felt: three quarters of the chord, forward of the centre of gravity, m. */
    feltX: number
    /** Section drag of the part that is only borrowed from the hull for its lift, on the area above. */
    borrowedDrag: number
    /** Moment against turning over speed and yaw rate, kg m. */
    turnDamping: number
  }
  rudder: Foil & {
    chord: number
    skegArea: number
    balance: number
    stop: number
    friction: number
    inertia: number
    speedRatio: number
    leewayRatio: number
  }
  /** Drag area of hull and rigging ahead and abeam, m^2, and its height. */
  windageAhead: number
  windageAbeam: number
  windageHeight: number
  centreX: number
  sails: VesselSail[]
  line: ControlLine
  /** Index in sails of the sail whose sheet gives the pull, or -1 when it is stowed. */
  source: number
}

export interface Foil {
  area: number
  slope: number
  aspect: number
  /** Forward of the centre of gravity, m. */
  x: number
  /** Depth of the centre of pressure, m. */
  depth: number
}

export function vesselOf(plan: Plan): Vessel {
  const { boat, setup } = plan
  const { hull, keel, rudder } = boat
  const tack = setup.conditions.trueWindAngleDeg < 0 ? -1 : 1
  const mass = hull.displacement
  const rollRadius = hull.rollRadiusRatio * hull.beamOverall
  const rollOwn = mass * rollRadius * rollRadius
  const yawRadius = hull.yawRadiusRatio * hull.lengthOverall
  const yawOwn = mass * yawRadius * yawRadius
  const added = addedMass(hull.waterlineLength, hull.canoeBodyDraught, mass, rollOwn)
  const keelDepth = hull.canoeBodyDraught + keel.span
  const keelArea = (keel.area * keelDepth) / keel.span
  const keelChord = keel.area / keel.span
  const keelAspect = (2 * keelDepth * keelDepth) / keelArea
  const keelMass = keelAddedMass(keelChord, keel.span)
  const keelMiddle = hull.canoeBodyDraught + keel.span / 2
  const rollInertia = rollOwn + added.roll + keelMass * keelMiddle * keelMiddle
  const keelSlope = liftSlope(keelAspect, keel.sweepDeg * DEGREE)
  const rudderAspect = (2 * rudder.span * rudder.span) / rudder.area
  // In a fixed order, so that sums come out the same to the last bit however the document was stored.
  const ids = Object.keys(boat.sails).sort()
  const sails = ids.flatMap((id) => vesselSail(plan, id, tack) ?? [])
  const source = sails.findIndex((sail) => sail.id === setup.source)
  return {
    tack,
    mass,
    surgeMass: mass + added.surge,
    swayMass: mass + added.sway + keelMass,
    keelMass,
    rollInertia,
    yawInertia: yawOwn + added.yaw,
    munkMass: added.sway - added.surge,
    gm: hull.metacentricHeight,
    vanishing: hull.vanishingAngleDeg * DEGREE,
    rollDamping:
      2 * hull.rollDampingRatio * Math.sqrt(mass * GRAVITY * hull.metacentricHeight * rollInertia),
    length: hull.waterlineLength,
    draught: hull.canoeBodyDraught,
    resistance: resistanceTable(plan),
    speedStep: SPEED_STEP,
    heelYawLever: hull.heelYawArm * hull.waterlineLength,
    // The keel carries its lift up through the hull: reckoned as if it reached the waterline
    // (extended-keel method, Gerritsma 1971; centre of pressure at .43 of the depth).
    keel: {
      area: keelArea,
      slope: keelSlope,
      feltX: keel.x - keelChord / 2 - hull.centreOfGravityX,
      borrowedDrag: FOIL_DRAG * (1 - keel.area / keelArea),
      turnDamping: turnDamping(keelSlope, keelChord, keelDepth),
      aspect: keelAspect,
      x: keel.x - hull.centreOfGravityX,
      depth: 0.43 * keelDepth,
    },
    rudder: {
      area: rudder.area,
      slope: liftSlope(rudderAspect),
      aspect: rudderAspect,
      x: -hull.centreOfGravityX,
      depth: 0.4 * hull.canoeBodyDraught + 0.45 * rudder.span,
      chord: rudder.area / rudder.span,
      skegArea: rudder.skegArea,
      balance: rudder.balance,
      stop: rudder.stopDeg * DEGREE,
      friction: rudder.friction,
      inertia: rudder.inertia,
      speedRatio: rudder.speedRatio,
      leewayRatio: rudder.leewayRatio,
    },
    windageAhead: 0.5 * hull.beamOverall * hull.freeboard + 0.08 * hull.lengthOverall,
    windageAbeam: 0.8 * hull.lengthOverall * hull.freeboard + 0.1 * hull.lengthOverall,
    windageHeight: hull.freeboard,
    centreX: hull.centreOfGravityX,
    sails,
    line: controlLineOf(plan, sails[source], tack),
    source,
  }
}

/** Upright resistance of the canoe body, N, at multiples of SPEED_STEP; the foils' friction is in their section drag. */
function resistanceTable(plan: Plan): Float64Array {
  const { hull } = plan.boat
  const top = HIGHEST_FROUDE * Math.sqrt(GRAVITY * hull.waterlineLength)
  const table = new Float64Array(Math.ceil(top / SPEED_STEP) + 2)
  for (let i = 0; i < table.length; i++) {
    table[i] = hullResistance(
      i * SPEED_STEP,
      hull.waterlineLength,
      hull.wettedArea,
      hull.displacement,
      hull.residuaryFactor,
    )
  }
  return table
}
