import { Button } from '~/ui/button'
import { type Playback, type Speed, STEP_S, speeds } from './playback'
import { usePlayhead } from './use-playback'
import { clock } from './wording'

interface Props {
  playback: Playback
  /** Read here too while the title block is out of sight. */
  verdict: string | null
}

/** Stays at the foot of the screen: playing the run, and what became of it. */
export function PlayBar({ playback, verdict }: Props) {
  const { timeS, endS, playing, speed } = usePlayhead(playback)
  return (
    <section
      aria-label="Playing the run"
      className="sticky bottom-0 z-10 flex flex-wrap items-center gap-x-4 border-t border-ink bg-paper px-4 text-note md:px-margin"
    >
      <Button
        weight="strong"
        className="w-20"
        onClick={() => (playing ? playback.pause() : playback.play())}
      >
        {playing ? 'Pause' : 'Play'}
      </Button>
      <div className="flex">
        <Button weight="word" aria-label="One second back" onClick={() => playback.step(-STEP_S)}>
          −1 s
        </Button>
        <Button weight="word" aria-label="One second on" onClick={() => playback.step(STEP_S)}>
          +1 s
        </Button>
      </div>
      <label className="flex items-center gap-2 text-ink-soft">
        Speed
        <select
          className="h-touch border-0 bg-paper px-1 text-ink"
          value={speed}
          onChange={(event) => playback.setSpeed(Number(event.target.value) as Speed)}
        >
          {speeds.map((choice) => (
            <option key={choice} value={choice}>
              {choice}×
            </option>
          ))}
        </select>
      </label>
      <label className="flex min-w-40 flex-1 items-center gap-3">
        <span className="w-24 text-right">
          {clock(timeS)} <span className="text-ink-soft">of {clock(endS)}</span>
        </span>
        <input
          type="range"
          aria-label="Moment of the run"
          aria-valuetext={`${clock(timeS)} of ${clock(endS)}`}
          className="h-touch flex-1"
          min={0}
          max={endS}
          step={1}
          value={Math.round(timeS)}
          onChange={(event) => playback.scrub(Number(event.target.value))}
        />
      </label>
      <p
        aria-hidden={verdict === null}
        className={`basis-full truncate pb-1 font-strong lg:max-w-[40%] lg:basis-auto lg:pb-0 ${verdict === null ? 'invisible' : ''}`}
      >
        {verdict}
      </p>
    </section>
  )
}
