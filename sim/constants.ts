/** Standard values, SI. */
export const RHO_AIR = 1.225
export const RHO_SEA = 1025
export const GRAVITY = 9.80665
export const NU_SEA = 1.19e-6

/** One knot in m/s, one degree in rad. */
export const KNOT = 1852 / 3600
export const DEGREE = Math.PI / 180
