import { useEffect, useState } from 'react'
import { clock } from '~/drawing/clock'
import { readings } from '~/drawing/readings'
import type { Measures, Run } from '~/drawing/types'
import type { Playback } from './playback'

interface Props {
  run: Run
  measures: Measures
  playback: Playback
}

/** The strip in words; still while the run plays, so that it can be read. */
export function Readings({ run, measures, playback }: Props) {
  const [atS, setAtS] = useState(0)
  useEffect(
    () =>
      playback.subscribe(() => {
        const { playing, timeS } = playback.head()
        if (!playing) setAtS(Math.round(timeS))
      }),
    [playback],
  )
  return (
    <section aria-labelledby="readings" className="border-t border-hair px-4 py-6 md:px-margin">
      <h2 id="readings" className="text-head font-strong">
        The strip in words
      </h2>
      <dl className="mt-3 grid gap-4 text-note sm:grid-cols-2 lg:grid-cols-4">
        {readings(run, atS, measures).map(({ plot, title, atCursor, overRun }) => (
          <div key={plot}>
            <dt className="font-strong">{title}</dt>
            <dd>{overRun}</dd>
            <dd className="text-ink-soft">
              At {clock(atS)}: {atCursor}
            </dd>
          </div>
        ))}
      </dl>
    </section>
  )
}
