/** What a request to simulate may ask for. */
export const bounds = {
  durationS: { min: 10, max: 3600, default: 600 },
  outputIntervalS: { min: 0.1, max: 60, default: 1 },
  seeds: { min: 1, max: 50, default: 1 },
  /** Output times of one run after the first. */
  samples: 12_000,
  /** Seconds sailed in all runs of a request with the adaptive solver, some twenty times slower. */
  adaptiveS: 7200,
  events: 100,
  bodyBytes: 256 * 1024,
} as const
