/** Changes whenever the same inputs would give different numbers. */
export const MODEL_VERSION = '1.0.0'
