const longest = 60

/** The name that differs least from what was typed, if it could well be what was meant. */
export function nearestName(typed: string, names: readonly string[]): string | undefined {
  if (typed.length > longest) return undefined
  let best: string | undefined
  let least = Math.max(2, Math.floor(typed.length / 3)) + 1
  for (const name of names) {
    const distance = editDistance(typed.toLowerCase(), name.toLowerCase())
    if (distance < least) {
      least = distance
      best = name
    }
  }
  return best
}

/** Insertions, deletions and replacements between two words (Wagner & Fischer 1974). */
function editDistance(from: string, to: string): number {
  let row = Array.from({ length: to.length + 1 }, (_, column) => column)
  for (let i = 1; i <= from.length; i++) {
    const next = [i]
    for (let j = 1; j <= to.length; j++) {
      const replaced = (row[j - 1] ?? 0) + (from[i - 1] === to[j - 1] ? 0 : 1)
      next[j] = Math.min(replaced, (row[j] ?? 0) + 1, (next[j - 1] ?? 0) + 1)
    }
    row = next
  }
  return row[to.length] ?? 0
}
