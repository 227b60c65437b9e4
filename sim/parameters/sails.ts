import { choice, quantity } from './define'

/** One sail's geometry, drawn for the boat at rest; the sheet lead is given for the starboard tack. */
export const sailParameters = {
  kind: choice({ label: 'Sail', options: { main: 'Mainsail', headsail: 'Headsail', mizzen: 'Mizzen', steering: 'Steering sail' }, default: 'main', source: 'Measured' }),
  area: quantity({ label: 'Area', symbol: 'A', unit: 'm2', min: 0.2, max: 80, step: 0.1, default: 14, source: 'Measured' }),
  luffX: quantity({ label: 'Luff at the foot, forward of the rudder stock', symbol: 'x_l', unit: 'm', min: -2, max: 16, step: 0.05, default: 4.6, source: 'Measured' }),
  footZ: quantity({ label: 'Foot above the waterline', symbol: 'z_f', unit: 'm', min: 0.5, max: 4, step: 0.05, default: 1.8, source: 'Measured' }),
  luffLength: quantity({ label: 'Luff', symbol: 'P', unit: 'm', min: 0.8, max: 20, step: 0.1, default: 8.2, source: 'Measured' }),
  footLength: quantity({ label: 'Foot', symbol: 'E', unit: 'm', min: 0.3, max: 9, step: 0.05, default: 3.2, source: 'Measured' }),
  camber: quantity({ label: 'Camber over chord', symbol: 'f/c', unit: '1', min: 0.03, max: 0.16, step: 0.005, default: 0.1, source: 'Common draughts of 8 to 14 %, from memory' }),
  sheetReach: quantity({ label: 'Sheet made fast, aft of the luff', symbol: 'a_s', unit: 'm', min: 0.2, max: 9, step: 0.05, default: 2.8, source: 'Boom block or clew' }),
  sheetX: quantity({ label: 'Sheet lead on deck, forward of the rudder stock', symbol: 'x_s', unit: 'm', min: -2, max: 14, step: 0.05, default: 1.6, source: 'Measured' }),
  sheetY: quantity({ label: 'Sheet lead, to leeward of the centreline', symbol: 'y_s', unit: 'm', min: -2.5, max: 2.5, step: 0.05, default: 0, source: 'Measured' }),
  sheetZ: quantity({ label: 'Sheet lead above the waterline', symbol: 'z_s', unit: 'm', min: 0.3, max: 3, step: 0.05, default: 1, source: 'Measured' }),
  sheetParts: quantity({ label: 'Parts of the sheet', symbol: 'n', unit: '1', min: 1, max: 6, step: 1, default: 4, whole: true, source: 'Measured' }),
} as const

/** What the crew can change on one sail. */
export const trimParameters = {
  set: choice({ label: 'Set', options: { yes: 'Set', no: 'Stowed' }, default: 'yes', source: 'Crew' }),
  sheetAngleDeg: quantity({ label: 'Sheeted to', symbol: 'beta_s', unit: 'deg', min: 0, max: 90, step: 0.5, default: 15, source: 'Boom or clew off the centreline when the sheet is tight', effect: 'Hardened: less angle, more weather helm from a main' }),
  reef: quantity({ label: 'Reefed or rolled away', symbol: 'r', unit: '%', min: 0, max: 70, step: 1, default: 0, source: 'Part of the area taken in', effect: 'Less sail, lower, less heel' }),
  held: choice({
    label: 'Held by',
    options: { sheet: 'Its sheet', preventer: 'Sheet and preventer', pole: 'Pole, to windward', backed: 'Backed, to windward' },
    default: 'sheet',
    source: 'Crew',
  }),
} as const
