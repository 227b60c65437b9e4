import { choice, quantity } from './define'

/** The control line, from the sheet over its leads to the tiller; drawn for the starboard tack, windward side positive. */
export const lineParameters = {
  pull: choice({
    label: 'How the pull is taken',
    options: { deflected: 'Hitched to a part of the sheet', tail: "The sheet's own tail" },
    default: 'deflected',
    source: 'Rigged',
  }),
  hitchDistance: quantity({ label: 'Hitch, from the deck block', symbol: 'a_h', unit: 'm', min: 0.05, max: 4, step: 0.01, default: 0.6, source: 'Rigged', effect: 'Towards the middle of the part: longer stroke, softer pull' }),
  takeUp: quantity({ label: 'Line taken up', symbol: 'd_0', unit: 'm', min: -0.5, max: 1.8, step: 0.01, default: 0.3, source: 'Hitch pulled out of straight with the tiller amidships', effect: 'Taking up bears her away' }),
  tillerRadius: quantity({ label: 'Line on the tiller, from the stock', symbol: 'r_l', unit: 'm', min: 0.1, max: 2.4, step: 0.01, default: 0.8, source: 'Rigged', effect: 'Further out: more moment, less angle for the same stroke' }),
  diameterMm: quantity({ label: 'Line diameter', symbol: 'd_l', unit: 'mm', min: 3, max: 14, step: 1, default: 6, source: 'Rigged' }),
  material: choice({ label: 'Line', options: { polyester: 'Polyester, double braid', hmpe: 'HMPE, double braid' }, default: 'polyester', source: 'Rigged' }),
} as const

/** One lead of the control line, in order from the hitch to the tiller. */
export const leadParameters = {
  kind: choice({ label: 'Lead', options: { ball: 'Ball-bearing block', plain: 'Plain block', fairlead: 'Fairlead', rub: 'Bare rub on coaming or rail' }, default: 'ball', source: 'Rigged' }),
  x: quantity({ label: 'Forward of the rudder stock', symbol: 'x_b', unit: 'm', min: -2, max: 14, step: 0.05, default: 1, source: 'Rigged' }),
  y: quantity({ label: 'To windward of the centreline', symbol: 'y_b', unit: 'm', min: -2.5, max: 2.5, step: 0.05, default: 0.8, source: 'Rigged' }),
  z: quantity({ label: 'Above the waterline', symbol: 'z_b', unit: 'm', min: 0.2, max: 3, step: 0.05, default: 1, source: 'Rigged' }),
} as const

export const elasticParameters = {
  stretch: quantity({ label: 'Elastic stretched', symbol: 'e_0', unit: 'm', min: -0.5, max: 2, step: 0.01, default: 0.3, source: 'Extension with the tiller amidships', effect: 'Stretching it further brings her up' }),
  diameterMm: quantity({ label: 'Elastic diameter', symbol: 'd_e', unit: 'mm', min: 3, max: 16, step: 1, default: 8, source: 'Rigged', effect: 'Thicker: stronger and stiffer' }),
  strands: quantity({ label: 'Parts of the elastic', symbol: 'n_e', unit: '1', min: 1, max: 6, step: 1, default: 1, whole: true, source: 'Rigged' }),
  naturalLength: quantity({ label: 'Elastic, slack length', symbol: 'L_e', unit: 'm', min: 0.15, max: 3, step: 0.01, default: 0.7, source: 'Rigged', effect: 'Longer: softer, wider range of wind' }),
  modulus: quantity({ label: 'Shear modulus of the cord', symbol: 'G_e', unit: 'MPa', min: 0.2, max: 3, step: 0.05, default: 0.9, source: 'Estimate over the whole cross-section, jacket and pre-stretched core included; no published load table was found, measure a pull' }),
  hysteresis: quantity({ label: 'Force lost in the elastic', symbol: 'h_e', unit: '1', min: 0, max: 0.3, step: 0.01, default: 0.08, source: 'Estimate for natural rubber in a braided jacket' }),
  tillerRadius: quantity({ label: 'Elastic on the tiller, from the stock', symbol: 'r_e', unit: 'm', min: 0.1, max: 2.4, step: 0.01, default: 0.8, source: 'Rigged' }),
  anchorX: quantity({ label: 'Elastic made fast, forward of the rudder stock', symbol: 'x_e', unit: 'm', min: -2, max: 10, step: 0.05, default: 0.8, source: 'Rigged' }),
  anchorY: quantity({ label: 'Elastic made fast, to leeward of the centreline', symbol: 'y_e', unit: 'm', min: 0.1, max: 2.5, step: 0.05, default: 1, source: 'Rigged' }),
  anchorZ: quantity({ label: 'Elastic made fast, above the waterline', symbol: 'z_e', unit: 'm', min: 0.2, max: 2.5, step: 0.05, default: 1, source: 'Rigged' }),
} as const
