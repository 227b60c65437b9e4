/** Places in the state vector; SI, radians; boom angles follow from BOOM on, one per sail set. */
export const NORTH = 0
export const EAST = 1
export const HEADING = 2
export const HEEL = 3
export const SURGE = 4
export const SWAY = 5
export const ROLL_RATE = 6
export const YAW_RATE = 7
export const RUDDER = 8
export const RUDDER_RATE = 9
export const BEARING_FRICTION = 10
export const LINE_FRICTION = 11
export const ELASTIC_FRICTION = 12
export const BOOM = 13
