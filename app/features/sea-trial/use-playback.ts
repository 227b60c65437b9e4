import { startTransition, useEffect, useMemo, useState, useSyncExternalStore } from 'react'
import { momentAt } from '~/drawing/moment'
import type { Moment, Run } from '~/drawing/types'
import { createPlayback, type Playback, type Playhead, type Speed } from './playback'

/** Beyond this speed running wave crests flicker and say nothing. */
const FASTEST_RUNNING_WATER: Speed = 8

/** A playback for one page: kept through every change of the run, playing by itself at first. */
export function usePlayback(endS: number): Playback {
  const [playback] = useState(() => createPlayback(endS))
  useEffect(() => playback.fit(endS), [playback, endS])
  useEffect(() => {
    if (!window.matchMedia(REDUCED).matches) playback.play()
    return () => playback.pause()
  }, [playback])
  return playback
}

/**
 * Where the cursor is. Frames of a playing run give way to everything else: as urgent updates,
 * one after another, they would keep a navigation from ever being shown.
 */
export function usePlayhead(playback: Playback): Playhead {
  const [head, setHead] = useState(playback.head)
  useEffect(() => {
    function follow() {
      const next = playback.head()
      if (next.playing) startTransition(() => setHead(next))
      else setHead(next)
    }
    follow()
    return playback.subscribe(follow)
  }, [playback])
  return head
}

/** The run at the cursor, and whether the water may move. */
export function useMoment(
  run: Run,
  playback: Playback,
): { moment: Moment; water: 'running' | 'still' } {
  const { timeS, playing, speed } = usePlayhead(playback)
  const reduced = useReducedMotion()
  const shownS = reduced && playing ? Math.floor(timeS / speed) * speed : timeS
  const moment = useMemo(() => momentAt(run, shownS), [run, shownS])
  return { moment, water: reduced || speed > FASTEST_RUNNING_WATER ? 'still' : 'running' }
}

const REDUCED = '(prefers-reduced-motion: reduce)'

function onReducedChange(listener: () => void) {
  const query = window.matchMedia(REDUCED)
  query.addEventListener('change', listener)
  return () => query.removeEventListener('change', listener)
}

/** With reduced motion a playing run is shown as a still each second. */
export function useReducedMotion(): boolean {
  return useSyncExternalStore(
    onReducedChange,
    () => window.matchMedia(REDUCED).matches,
    () => false,
  )
}
