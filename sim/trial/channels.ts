/**
 * What a run records at every output time. The order is the order of columns in an export.
 * Angles, rates and the tiller are positive to starboard; wind angles and the course to the
 * wind are positive with the wind over the starboard side.
 */
export const channels = {
  timeS: { label: 'Time', unit: 's' },
  courseToWindDeg: { label: 'Course to the wind', unit: 'deg' },
  headingDeg: { label: 'Heading', unit: 'deg' },
  heelDeg: { label: 'Heel', unit: 'deg' },
  speedKn: { label: 'Speed through the water', unit: 'kn' },
  leewayDeg: { label: 'Leeway', unit: 'deg' },
  rollRateDegS: { label: 'Roll rate', unit: 'deg/s' },
  yawRateDegS: { label: 'Yaw rate', unit: 'deg/s' },
  tillerDeg: { label: 'Tiller', unit: 'deg' },
  controlLineN: { label: 'Control line', unit: 'N' },
  elasticN: { label: 'Elastic', unit: 'N' },
  sheetN: { label: 'Sheet', unit: 'N' },
  northM: { label: 'North', unit: 'm' },
  eastM: { label: 'East', unit: 'm' },
  windDirectionDeg: { label: 'Wind from', unit: 'deg' },
  windSpeedKn: { label: 'Wind', unit: 'kn' },
  apparentWindAngleDeg: { label: 'Apparent wind angle', unit: 'deg' },
  apparentWindSpeedKn: { label: 'Apparent wind', unit: 'kn' },
  hitchOutM: { label: 'Hitch pulled out of straight', unit: 'm' },
  elasticStretchM: { label: 'Elastic stretch', unit: 'm' },
  waveM: { label: 'Water surface at the boat', unit: 'm' },
} as const

/** Name of a recorded quantity. */
export type Channel = keyof typeof channels

/** Column of values per channel, all of the same length. */
export type Series = Record<Channel, Float64Array>
