import { memo } from 'react'
import type { Band } from 'sim/trial/types'
import { radians, tenth, wrapDegrees } from './frame'
import type { Anchor } from './types'

/** The ring of courses round the boat: the wind at the top, degrees off it down both sides. */
export interface Ring {
  centre: Anchor
  radius: number
}

/** On paper the wind comes from the top, so a course with it over the starboard side lies left. */
export function onRing(ring: Ring, courseDeg: number, radius = ring.radius): Anchor {
  const angle = radians(-courseDeg)
  return {
    x: tenth(ring.centre.x + radius * Math.sin(angle)),
    y: tenth(ring.centre.y - radius * Math.cos(angle)),
  }
}

function spoke(ring: Ring, courseDeg: number, from: number, to: number): string {
  const inner = onRing(ring, courseDeg, from)
  const outer = onRing(ring, courseDeg, to)
  return `M${inner.x} ${inner.y}L${outer.x} ${outer.y}`
}

function arc(ring: Ring, fromDeg: number, toDeg: number): string {
  const a = onRing(ring, fromDeg)
  const b = onRing(ring, toDeg)
  const large = Math.abs(toDeg - fromDeg) > 180 ? 1 : 0
  return `M${a.x} ${a.y}A${ring.radius} ${ring.radius} 0 ${large} 0 ${b.x} ${b.y}`
}

const everyTen = Array.from({ length: 36 }, (_, index) => index * 10 - 170)
const everyThirty = everyTen.filter((course) => course % 30 === 0)
const everyTwo = Array.from({ length: 180 }, (_, index) => index * 2 - 178)

/** Graduated every two degrees, as a bearing plate is. */
export const RingGraduation = memo(function RingGraduation({ centre, radius }: Ring) {
  const ring = { centre, radius }
  const fine = everyTwo.filter((course) => course % 10 !== 0)
  return (
    <g className="fill-none stroke-ink-soft">
      <circle cx={centre.x} cy={centre.y} r={radius} strokeWidth={1} />
      <path
        d={fine.map((course) => spoke(ring, course, radius, radius + 3)).join('')}
        strokeWidth={0.6}
        className="stroke-ink-pale"
      />
      <path
        d={everyTen
          .map((course) => spoke(ring, course, radius, radius + (course % 30 ? 7 : 11)))
          .join('')}
        strokeWidth={1}
      />
    </g>
  )
})

/** Courses at which the run still holds: the water she should stay in. */
export const BandSector = memo(function BandSector({ ring, band }: { ring: Ring; band: Band }) {
  const low = band.centreDeg - band.halfWidthDeg
  const high = band.centreDeg + band.halfWidthDeg
  const { centre, radius } = ring
  const rim = arc(ring, low, high)
  const outer = { centre, radius: radius + 5.5 }
  return (
    <g className="fill-none stroke-ink">
      <path d={`${rim}L${centre.x} ${centre.y}Z`} className="fill-band stroke-none" />
      <path
        d={`${spoke(ring, low, 0, radius)}${spoke(ring, high, 0, radius)}`}
        strokeWidth={1}
        strokeDasharray="1.5 5"
        strokeLinecap="round"
        className="stroke-ink-soft"
      />
      <path d={arc(outer, low, high)} strokeWidth={8} className="stroke-ink" />
    </g>
  )
})

interface RingFiguresProps {
  ring: Ring
  /** Courses written at the ring: the figures near them give way. */
  written: readonly number[]
  format: (stored: number) => string
}

export function RingFigures({ ring, written, format }: RingFiguresProps) {
  return (
    <g textAnchor="middle" className="fill-ink-soft">
      {everyThirty.map((course) => {
        if (course === 0) return null
        const at = onRing(ring, course, ring.radius + 24)
        const near = written.some(
          (other) => Math.abs(wrapDegrees(course - other)) * radians(1) * ring.radius < 52,
        )
        return (
          <text
            key={course}
            x={at.x}
            y={at.y + 5}
            className="fill-ink-soft"
            visibility={near ? 'hidden' : 'visible'}
          >
            {format(Math.abs(course))}
          </text>
        )
      })}
    </g>
  )
}

interface CoursePointerProps {
  ring: Ring
  courseDeg: number
  text: string
  /** Where the dashed line of the keel begins, from the centre. */
  from: number
  /** Where the sheet has little room beside the ring. */
  small: boolean
}

/** The keel's line carried out to the ring, with her course to the wind. */
export function CoursePointer({ ring, courseDeg, text, from, small }: CoursePointerProps) {
  const { radius } = ring
  const tip = onRing(ring, courseDeg, radius - 1)
  const sideways = small ? 2 : 16
  const label = onRing(
    ring,
    courseDeg,
    radius + 28 + sideways * Math.abs(Math.sin(radians(courseDeg))),
  )
  // Head to wind it stands beside the wind's arrow.
  const aside = ring.centre.x - label.x
  if (Math.abs(courseDeg) < 90 && Math.abs(aside) < 40)
    label.x = ring.centre.x - (courseDeg < 0 ? -40 : 40)
  return (
    <g>
      <path
        d={spoke(ring, courseDeg, from, radius - 18)}
        className="fill-none stroke-ink"
        strokeWidth={1}
        strokeDasharray="14 4 2 4"
      />
      <path
        d="M0 0L6 18H-6Z"
        transform={`translate(${tip.x} ${tip.y}) rotate(${tenth(-courseDeg)})`}
        className="fill-ink"
      />
      <text
        x={label.x}
        y={label.y + 8}
        textAnchor="middle"
        className="fill-ink stroke-paper [paint-order:stroke]"
        strokeWidth={5}
        strokeLinejoin="round"
        style={{ fontSize: small ? 17.5 : 21.875, fontWeight: 600 }}
      >
        {text}
      </text>
    </g>
  )
}

interface GhostPointerProps {
  ring: Ring
  courseDeg: number
  /** Null where there is no room for it; the strip names it all the same. */
  label: string | null
  dash: string
}

/** Another helm on the same seed: a dash within the ring, with its name outside of it. */
export function GhostPointer({ ring, courseDeg, label, dash }: GhostPointerProps) {
  const at = onRing(ring, courseDeg, ring.radius + 15)
  const aside = Math.sin(radians(-courseDeg))
  return (
    <g>
      <path
        d={spoke(ring, courseDeg, ring.radius - 26, ring.radius)}
        className="fill-none stroke-ink-soft"
        strokeWidth={1.5}
        strokeDasharray={dash}
      />
      <text
        x={at.x}
        y={tenth(at.y + 5 - 5 * Math.cos(radians(courseDeg)))}
        textAnchor={Math.abs(aside) < 0.3 ? 'middle' : aside > 0 ? 'start' : 'end'}
        className="fill-ink-soft stroke-paper [paint-order:stroke]"
        strokeWidth={4}
      >
        {label}
      </text>
    </g>
  )
}

/** Nearer to another name than this, along the ring, a ghost's gives way. */
const nameRoomPx = 58

/** Courses at which a name can stand: clear of her own course, of each other and of the wind. */
export function namedCourses(
  ring: Ring,
  ownCourseDeg: number,
  ghostCoursesDeg: readonly number[],
): boolean[] {
  const taken = [ownCourseDeg, 0]
  return ghostCoursesDeg.map((course) => {
    const clear = taken.every(
      (other) => Math.abs(wrapDegrees(course - other)) * radians(1) * ring.radius > nameRoomPx,
    )
    if (clear) taken.push(course)
    return clear
  })
}
