const made = globalThis as unknown as Record<symbol, unknown>

/**
 * Makes something that outlives a request, such as a pool. In development a module is evaluated
 * again after each edit; the one that the last evaluation made is closed then.
 */
export function onePerProcess<Made>(
  name: string,
  make: () => Made,
  close: (earlier: Made) => void,
): Made {
  const key = Symbol.for(`counterhelm.${name}`)
  const earlier = made[key] as Made | undefined
  if (earlier !== undefined) close(earlier)
  const fresh = make()
  made[key] = fresh
  return fresh
}
