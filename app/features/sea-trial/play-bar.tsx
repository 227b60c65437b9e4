import { clock } from '~/drawing/clock'
import { Button } from '~/ui/button'
import { type Playback, type Speed, STEP_S, speeds } from './playback'
import { usePlayhead } from './use-playback'

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
      className="sticky bottom-0 z-10 grid grid-cols-[auto_auto_1fr] items-center gap-x-4 border-t border-ink bg-paper px-4 text-note md:grid-cols-[auto_auto_auto_1fr] md:px-margin lg:grid-cols-[auto_auto_auto_1fr_minmax(0,auto)]"
    >
      <Button
        weight="strong"
        className="w-20"
        onClick={() => (playing ? playback.pause() : playback.play())}
      >
        {playing ? 'Pause' : 'Play'}
      </Button>
      <div className="flex max-md:hidden">
        <Button weight="word" aria-label="One second back" onClick={() => playback.step(-STEP_S)}>
          −1 s
        </Button>
        <Button weight="word" aria-label="One second on" onClick={() => playback.step(STEP_S)}>
          +1 s
        </Button>
      </div>
      <label className="flex items-center gap-2 text-ink-soft">
        <span className="max-md:sr-only">Speed</span>
        <select
          className="min-h-touch text-ink"
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
      <div className="flex min-w-0 items-center gap-3">
        <span className="shrink-0 text-right md:w-24">
          {clock(timeS)} <span className="text-ink-soft max-md:sr-only">of {clock(endS)}</span>
        </span>
        <div className="rule min-w-0 flex-1">
          <div className="rule-scale" />
          <input
            type="range"
            aria-label="Moment of the run"
            aria-valuetext={`${clock(timeS)} of ${clock(endS)}`}
            min={0}
            max={endS}
            step={STEP_S}
            value={Math.round(timeS)}
            onChange={(event) => playback.scrub(Number(event.target.value))}
          />
        </div>
      </div>
      <p
        className={`col-span-full truncate pb-1 font-strong lg:col-span-1 lg:max-w-md lg:pb-0 ${verdict === null ? 'hidden' : ''}`}
      >
        {verdict}
      </p>
    </section>
  )
}
