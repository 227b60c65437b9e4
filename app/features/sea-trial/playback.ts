/**
 * Moving through a run that is already computed. The run never depends on how it is played: a
 * faster speed moves the cursor further per frame over the same curves.
 */

export const speeds = [1, 2, 4, 8, 15, 30, 60] as const
export type Speed = (typeof speeds)[number]

export interface Playhead {
  readonly timeS: number
  readonly endS: number
  readonly playing: boolean
  readonly speed: Speed
}

export const STEP_S = 1

/** After a pause of the page (a hidden tab) playing goes on from where it was. */
const LONGEST_FRAME_S = 0.25

export function advanced(head: Playhead, elapsedS: number): Playhead {
  if (!head.playing) return head
  const timeS = head.timeS + Math.min(elapsedS, LONGEST_FRAME_S) * head.speed
  return timeS >= head.endS ? { ...head, timeS: head.endS, playing: false } : { ...head, timeS }
}

export function played(head: Playhead): Playhead {
  return { ...head, timeS: head.timeS >= head.endS ? 0 : head.timeS, playing: true }
}

export function scrubbed(head: Playhead, timeS: number): Playhead {
  return { ...head, timeS: Math.min(Math.max(timeS, 0), head.endS) }
}

/** A new run of another length keeps the moment; only a shorter one moves it to its end. */
export function fitted(head: Playhead, endS: number): Playhead {
  if (endS === head.endS) return head
  return { ...head, endS, timeS: Math.min(head.timeS, endS) }
}

export interface Playback {
  subscribe(listener: () => void): () => void
  head(): Playhead
  play(): void
  pause(): void
  step(byS: number): void
  scrub(timeS: number): void
  setSpeed(speed: Speed): void
  fit(endS: number): void
}

/** The frames of a page; given so that a test can hand out its own. */
export interface Frames {
  request(callback: (nowMs: number) => void): number
  cancel(handle: number): void
}

const pageFrames: Frames = {
  request: (callback) => requestAnimationFrame(callback),
  cancel: (handle) => cancelAnimationFrame(handle),
}

export function createPlayback(endS: number, frames: Frames = pageFrames): Playback {
  const listeners = new Set<() => void>()
  let head: Playhead = { timeS: 0, endS, playing: false, speed: 4 }
  let frame: number | null = null
  let lastMs: number | null = null

  function move(next: Playhead) {
    if (next === head) return
    head = next
    if (head.playing && frame === null) {
      lastMs = null
      frame = frames.request(onFrame)
    }
    if (!head.playing && frame !== null) {
      frames.cancel(frame)
      frame = null
    }
    for (const listener of listeners) listener()
  }

  function onFrame(nowMs: number) {
    frame = frames.request(onFrame)
    const elapsedS = lastMs === null ? 0 : (nowMs - lastMs) / 1000
    lastMs = nowMs
    move(advanced(head, elapsedS))
  }

  return {
    subscribe(listener) {
      listeners.add(listener)
      return () => {
        listeners.delete(listener)
      }
    },
    head: () => head,
    play: () => move(played(head)),
    pause: () => move({ ...head, playing: false }),
    step: (byS) => move(scrubbed({ ...head, playing: false }, head.timeS + byS)),
    scrub: (timeS) => move(scrubbed(head, timeS)),
    setSpeed: (speed) => move({ ...head, speed }),
    fit: (length) => move(fitted(head, length)),
  }
}
