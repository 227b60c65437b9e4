import type { SetupEntry } from '~/features/setups/schema'

/** What the sea trial opens with: the first setup that is meant to hold. */
export function firstSetup(entries: readonly SetupEntry[]): SetupEntry | undefined {
  return entries.find((entry) => !entry.flaw) ?? entries[0]
}
