import type { Ghost } from './types'

/** One dash for each helm, on the sheet and on the strip. */
export const ghostDash: Record<Ghost['helm'], string> = { lashed: '7 4', free: '2 4' }
