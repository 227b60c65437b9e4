/** A moment of a run: "2:05". */
export function clock(timeS: number): string {
  const whole = Math.floor(timeS + 1e-6)
  return `${Math.floor(whole / 60)}:${String(whole % 60).padStart(2, '0')}`
}
