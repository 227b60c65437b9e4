import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import {
  advanced,
  createPlayback,
  type Frames,
  fitted,
  type Playhead,
  played,
  scrubbed,
  speeds,
} from '~/features/sea-trial/playback'

const head: Playhead = { timeS: 100, endS: 600, playing: true, speed: 4 }

describe('the cursor', () => {
  test('moves by the speed times the time that passed', () => {
    expect(advanced(head, 0.1).timeS).toBeCloseTo(100.4, 9)
    expect(advanced({ ...head, speed: 60 }, 0.1).timeS).toBeCloseTo(106, 9)
  })

  test('is in the same place after the same time, however it is cut into frames', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 0, max: 0.2, noNaN: true }), { maxLength: 60 }),
        fc.constantFrom(...speeds),
        (frames, speed) => {
          const inFrames = frames.reduce(advanced, { ...head, timeS: 0, endS: 1e6, speed })
          const total = frames.reduce((sum, frame) => sum + frame, 0)
          expect(inFrames.timeS).toBeCloseTo(total * speed, 6)
        },
      ),
    )
  })

  test('does not leap after the page was hidden', () => {
    expect(advanced(head, 3600).timeS).toBe(101)
  })

  test('stops at the end, and playing on from there starts over', () => {
    const ended = advanced({ ...head, timeS: 599.9 }, 0.2)
    expect(ended).toMatchObject({ timeS: 600, playing: false })
    expect(played(ended)).toMatchObject({ timeS: 0, playing: true })
  })

  test('stays within the run wherever it is dragged', () => {
    expect(scrubbed(head, -5).timeS).toBe(0)
    expect(scrubbed(head, 900).timeS).toBe(600)
  })

  test('keeps its moment when the run is computed again', () => {
    expect(fitted(head, 600)).toBe(head)
    expect(fitted(head, 1200).timeS).toBe(100)
    expect(fitted(head, 60).timeS).toBe(60)
  })
})

describe('playback', () => {
  function byHand() {
    let next: ((nowMs: number) => void) | null = null
    let nowMs = 0
    const frames: Frames = {
      request(callback) {
        next = callback
        return 1
      },
      cancel() {
        next = null
      },
    }
    const pass = (ms: number) => {
      nowMs += ms
      const callback = next
      next = null
      callback?.(nowMs)
    }
    return { frames, pass, waiting: () => next !== null }
  }

  test('asks for frames only while playing', () => {
    const { frames, pass, waiting } = byHand()
    const playback = createPlayback(600, frames)
    expect(waiting()).toBe(false)
    playback.play()
    pass(0)
    pass(100)
    expect(playback.head().timeS).toBeCloseTo(0.4, 9)
    playback.pause()
    expect(waiting()).toBe(false)
    pass(100)
    expect(playback.head().timeS).toBeCloseTo(0.4, 9)
  })

  test('does not count the time it was paused', () => {
    const { frames, pass } = byHand()
    const playback = createPlayback(600, frames)
    playback.play()
    pass(0)
    pass(100)
    playback.pause()
    pass(200)
    playback.play()
    pass(0)
    pass(100)
    expect(playback.head().timeS).toBeCloseTo(0.8, 9)
  })

  test('tells its listeners of every move, and no longer once they left', () => {
    const { frames } = byHand()
    const playback = createPlayback(600, frames)
    let told = 0
    const leave = playback.subscribe(() => told++)
    playback.scrub(30)
    playback.step(1)
    expect(told).toBe(2)
    expect(playback.head()).toMatchObject({ timeS: 31, playing: false })
    leave()
    playback.scrub(60)
    expect(told).toBe(2)
  })

  test('stops asking for frames at the end of the run', () => {
    const { frames, pass, waiting } = byHand()
    const playback = createPlayback(1, frames)
    playback.play()
    pass(0)
    for (let n = 0; n < 20; n++) pass(100)
    expect(playback.head()).toMatchObject({ timeS: 1, playing: false })
    expect(waiting()).toBe(false)
  })
})
