import type { Run } from '~/drawing/types'
import { inWords, rounded, type Units } from '~/features/units/units'
import { courseInWords } from './wording'

interface Props {
  run: Run
  units: Units
  /** Day the run was made, as written in a title block. */
  date: string
}

/** Lower right corner of the sheet: what this is a drawing of. */
export function TitleBlock({ run, units, date }: Props) {
  const { plan, conditions, helm } = run.request
  const { boat, setup } = plan
  const { metrics, modelVersion } = run.result
  const speed = (kn: number) => inWords(rounded('kn', kn, units, 0.1))
  const force = (newtons: number) => inWords(rounded('N', newtons, units, 1))
  const angle = (deg: number) => inWords(rounded('deg', deg, units, 1))
  const wind = inWords(rounded('kn', conditions.trueWindSpeedKn, units, 0.5))
  const sea = inWords(rounded('m', conditions.significantWaveHeightM, units, 0.1))

  const rows: [string, string][] = [
    ['Boat', `${boat.name}, ${boat.type}`],
    ['Setup', setup.name],
    ['Helm', helmNames[helm]],
    ['Wind', `${wind}, gustiness ${conditions.turbulenceIntensity.toFixed(2)}`],
    ['Sea', `${sea} every ${conditions.peakWavePeriodS.toFixed(1)} s`],
    ['Course asked', courseInWords(conditions.trueWindAngleDeg)],
    ['Course held', courseInWords(metrics.meanCourseToWindDeg)],
    [
      'Off it',
      `${angle(metrics.rmsCourseErrorDeg)} rms, ${angle(metrics.maxCourseErrorDeg)} at most`,
    ],
    [
      `Within ${run.result.band.halfWidthDeg}° of it`,
      `${Math.round(metrics.withinBandFraction * 100)} % of the time`,
    ],
    ['Speed', `${speed(metrics.meanSpeedKn)}, ${speed(metrics.balanceSpeedKn)} in balance`],
    ['Heel', `${angle(metrics.maxHeelDeg)} at most`],
    [
      'Peak loads',
      `line ${force(metrics.peakControlLineN)}, elastic ${force(metrics.peakElasticN)}, sheet ${force(metrics.peakSheetN)}`,
    ],
    ['Seed, model, date', `${conditions.seed}, ${modelVersion}, ${date}`],
  ]
  return (
    <dl className="grid grid-cols-[max-content_1fr] border border-ink text-note">
      {rows.map(([name, text]) => (
        <div
          key={name}
          className="col-span-2 grid grid-cols-subgrid border-b border-hair last:border-0"
        >
          <dt className="border-r border-hair px-2 py-0.5 text-ink-soft">{name}</dt>
          <dd className="px-2 py-0.5">{text}</dd>
        </div>
      ))}
    </dl>
  )
}

export const helmNames = {
  'sheet-to-tiller': 'Sheet to tiller',
  lashed: 'Tiller lashed',
  free: 'Tiller free',
} as const
