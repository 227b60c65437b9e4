import { vesselOf } from 'sim/boat/vessel'
import { createWaveLoads } from 'sim/boat/wave-loads'
import { DEGREE, GRAVITY } from 'sim/constants'
import { encounterFrequency, phaseSpeed, waveLength, waveNumber } from 'sim/sea/deep-water'
import { type Seaway, seaway } from 'sim/sea/seaway'
import { bretschneider } from 'sim/sea/spectrum'
import { describe, expect, test } from 'vitest'
import { plainPlan } from './bare-vessel'

const period = (omega: number) => (2 * Math.PI) / omega

/** One long-crested wave running to the north. */
function single(wavePeriod: number, amplitude: number): Seaway {
  const omega = (2 * Math.PI) / wavePeriod
  return {
    count: 1,
    amplitude: Float64Array.of(amplitude),
    omega: Float64Array.of(omega),
    k: Float64Array.of(waveNumber(omega)),
    cosDirection: Float64Array.of(1),
    sinDirection: Float64Array.of(0),
    phase: Float64Array.of(0),
  }
}

describe('deep-water waves', () => {
  // Airy theory, g 9.80665 (computed).
  test.each([
    [3, 14.047, 4.682],
    [4, 24.972, 6.243],
    [5, 39.019, 7.804],
    [6, 56.188, 9.365],
    [8, 99.89, 12.486],
  ])('of %d s', (wavePeriod, length, speed) => {
    expect(waveLength(wavePeriod)).toBeCloseTo(length, 3)
    expect(phaseSpeed(wavePeriod)).toBeCloseTo(speed, 3)
    expect((2 * Math.PI) / waveNumber((2 * Math.PI) / wavePeriod)).toBeCloseTo(length, 3)
  })
})

describe('encounter period', () => {
  // Following sea = 0 (computed).
  const table = [
    [6, 3, 0, 8.828],
    [6, 3, 180, 4.544],
    [5, 3, 45, 6.867],
    [4, 3.5, 0, 9.104],
  ] as const

  test.each(table)('of a %d s wave at %d m/s, heading %d', (wavePeriod, speed, heading, met) => {
    const omega = (2 * Math.PI) / wavePeriod
    expect(period(encounterFrequency(omega, speed, heading * DEGREE))).toBeCloseTo(met, 3)
  })

  test.each(table)(
    'felt by a boat that sails through a %d s wave at %d m/s, heading %d',
    (...row) => {
      const [wavePeriod, speed, heading, met] = row
      const loads = createWaveLoads(single(wavePeriod, 0.4), vesselOf(plainPlan))
      const cos = Math.cos(heading * DEGREE)
      const sin = Math.sin(heading * DEGREE)
      const crossings: number[] = []
      let before = 0
      for (let i = 0; i < 12000; i++) {
        const t = i * 0.01
        loads.update(speed * t * cos, speed * t * sin, cos, sin, t, 1)
        if (before < 0 && loads.surface >= 0) {
          crossings.push(t - 0.01 * (loads.surface / (loads.surface - before)))
        }
        before = loads.surface
      }
      const first = crossings[0] as number
      const last = crossings[crossings.length - 1] as number
      expect((last - first) / (crossings.length - 1)).toBeCloseTo(met, 2)
    },
  )
})

describe('water in a wave', () => {
  test('moves with a omega e^(-k z) at the depth of keel and rudder', () => {
    const vessel = vesselOf(plainPlan)
    const omega = (2 * Math.PI) / 4
    const loads = createWaveLoads(single(4, 0.3), vessel)
    let keel = 0
    let rudder = 0
    for (let t = 0; t < 4; t += 0.005) {
      // Beam sea: heading east, wave to the north, that is to port.
      loads.update(0, 0, 0, 1, t, 1)
      keel = Math.max(keel, Math.abs(loads.orbitalY))
      rudder = Math.max(rudder, Math.abs(loads.rudderOrbitalY))
    }
    const k = (omega * omega) / GRAVITY
    expect(keel).toBeCloseTo(0.3 * omega * Math.exp(-k * vessel.keel.depth), 4)
    expect(rudder).toBeCloseTo(0.3 * omega * Math.exp(-k * vessel.rudder.depth), 4)
  })

  test('pushes a short body with its own acceleration and tilts it by the slope', () => {
    // Long-wave limit of Froude-Krylov with diffraction: Y = (m + m22) a, slope a k, in a 12 s wave (224 m).
    const vessel = vesselOf(plainPlan)
    const omega = (2 * Math.PI) / 12
    const k = (omega * omega) / GRAVITY
    const loads = createWaveLoads(single(12, 0.5), vessel)
    let sway = 0
    let slope = 0
    for (let t = 0; t < 12; t += 0.01) {
      loads.update(0, 0, 0, 1, t, 1)
      sway = Math.max(sway, Math.abs(loads.sway))
      slope = Math.max(slope, Math.abs(loads.slope))
    }
    expect(sway / (vessel.swayMass * 0.5 * omega * omega)).toBeCloseTo(1, 1)
    expect(slope / (0.5 * k)).toBeCloseTo(1, 1)
  })

  test.each([2, 3.5, 6])(
    'pushes and turns the hull as its strips together in a %d s wave',
    (wavePeriod) => {
      const vessel = vesselOf(plainPlan)
      const loads = createWaveLoads(single(wavePeriod, 0.3), vessel)
      const omega = (2 * Math.PI) / wavePeriod
      const k = (omega * omega) / GRAVITY
      const acceleration = 0.3 * omega * omega * Math.exp((-k * vessel.draught) / 2)
      const whole = (vessel.swayMass - vessel.keelMass) * acceleration
      const keel = vessel.keelMass * 0.3 * omega * omega * Math.exp(-k * vessel.keel.depth)
      for (const degrees of [20, 45, 80, 130, -70]) {
        // Heading that puts the wave, which runs north, this far off the bow; x forward, sway to starboard.
        const cosine = Math.cos(degrees * DEGREE)
        const sine = Math.sin(degrees * DEGREE)
        for (const t of [0.3, 1.1]) {
          loads.update(0, 0, cosine, sine, t, 1)
          let sway = sine * Math.sin(omega * t) * keel
          let yaw = 0
          const strips = 2000
          for (let i = 0; i < strips; i++) {
            const share = (2 * (i + 0.5)) / strips - 1
            const x = (share * vessel.length) / 2
            const push = -sine * Math.sin(k * x * cosine - omega * t) * 0.75 * (1 - share * share)
            sway += (push * whole * 2) / strips
            yaw += (x * push * whole * 2) / strips
          }
          expect(Math.abs(loads.sway - sway)).toBeLessThan(2e-4 * whole)
          expect(Math.abs(loads.yaw - yaw)).toBeLessThan((2e-4 * whole * vessel.length) / 2)
        }
      }
    },
  )

  test('lets a beam sea yaw a symmetric hull not at all, and a quartering one most', () => {
    const loads = createWaveLoads(single(3.5, 0.3), vesselOf(plainPlan))
    const most = (degrees: number) => {
      let yaw = 0
      const c = Math.cos(degrees * DEGREE)
      const s = Math.sin(degrees * DEGREE)
      for (let t = 0; t < 3.5; t += 0.01) {
        loads.update(0, 0, c, s, t, 1)
        yaw = Math.max(yaw, Math.abs(loads.yaw))
      }
      return yaw
    }
    expect(most(90)).toBeLessThan(1e-6)
    expect(most(0)).toBeLessThan(1e-6)
    expect(most(45)).toBeGreaterThan(most(75))
    expect(most(45)).toBeGreaterThan(most(15))
  })
})

describe('spectrum of a sea', () => {
  const moment = (n: number) => {
    let sum = 0
    const step = 0.0005
    for (let omega = step; omega < 60; omega += step) {
      sum += omega ** n * bretschneider(omega, 2, 7) * step
    }
    return sum
  }

  test('holds Hs^2/16', () => {
    expect(moment(0)).toBeCloseTo(4 / 16, 4)
  })

  test('has the mean periods of Bretschneider', () => {
    // T1/Tp .771771, Tz/Tp .710371, Te/Tp .857223 (computed).
    expect((2 * Math.PI * moment(0)) / moment(1) / 7).toBeCloseTo(0.771771, 3)
    expect((2 * Math.PI * Math.sqrt(moment(0) / moment(2))) / 7).toBeCloseTo(0.710371, 2)
    expect((2 * Math.PI * moment(-1)) / moment(0) / 7).toBeCloseTo(0.857223, 3)
  })

  // Pierson-Moskowitz (read, Stewart, Introduction to Physical Oceanography, ch. 16): omega_p = .877 g/U19.5,
  // U19.5 = 1.026 U10, Hs = 4 sqrt(2.74e-3) U19.5^2/g; Hs and Tp computed from it.
  test.each([
    [5, 0.56, 3.75],
    [7.5, 1.26, 5.62],
    [10, 2.25, 7.49],
    [15, 5.06, 11.24],
  ])('is that of Pierson and Moskowitz in a fully grown sea at %d m/s', (wind, height, peak) => {
    const u = 1.026 * wind
    const omega0 = GRAVITY / u
    expect(Math.abs((4 * Math.sqrt(2.74e-3) * u * u) / GRAVITY - height)).toBeLessThan(0.01)
    expect(Math.abs(period(0.877 * omega0) - peak)).toBeLessThan(0.01)
    for (const ratio of [0.8, 1, 1.5, 2.5]) {
      const omega = (ratio * 2 * Math.PI) / peak
      // alpha 8.1e-3, beta .74: from memory, sure.
      const published =
        ((8.1e-3 * GRAVITY ** 2) / omega ** 5) * Math.exp(-0.74 * (omega0 / omega) ** 4)
      expect(Math.abs(bretschneider(omega, height, peak) / published - 1)).toBeLessThan(0.03)
    }
  })
})

describe('a seaway', () => {
  test.each([1, 2, 3, 50, 999])('from seed %d has the asked height exactly', (seed) => {
    const { amplitude } = seaway(seed, 1.2, 5, 0)
    const variance = amplitude.reduce((sum, a) => sum + (a * a) / 2, 0)
    expect(4 * Math.sqrt(variance)).toBeCloseTo(1.2, 9)
  })

  test('crosses its mean with the period of the spectrum up to three times its peak, within 2 percent', () => {
    // Left out are 1.5 percent of the energy, in ripples; without them Tz is 7 percent longer (integrated here).
    let energy = 0
    let curvature = 0
    for (let omega = 0.0005; omega < (3 * 2 * Math.PI) / 5; omega += 0.0005) {
      energy += bretschneider(omega, 1, 5)
      curvature += omega ** 2 * bretschneider(omega, 1, 5)
    }
    const kept = (2 * Math.PI * Math.sqrt(energy / curvature)) / 5
    let ratios = 0
    const seeds = 200
    for (let seed = 1; seed <= seeds; seed++) {
      const { amplitude, omega } = seaway(seed, 1, 5, 0)
      let m0 = 0
      let m2 = 0
      amplitude.forEach((a, i) => {
        m0 += a * a
        m2 += a * a * (omega[i] as number) ** 2
      })
      ratios += (2 * Math.PI * Math.sqrt(m0 / m2)) / 5 / seeds
    }
    expect(Math.abs(kept / 0.710371 - 1)).toBeLessThan(0.08)
    expect(Math.abs(ratios / kept - 1)).toBeLessThan(0.02)
  })

  test('comes from within a right angle of its mean direction, evenly on both sides', () => {
    let sine = 0
    let count = 0
    let squares = 0
    for (let seed = 1; seed <= 200; seed++) {
      const { sinDirection, cosDirection } = seaway(seed, 1, 5, 0)
      sinDirection.forEach((s, i) => {
        const angle = Math.atan2(-s, -(cosDirection[i] as number))
        expect(Math.abs(angle)).toBeLessThanOrEqual(Math.PI / 2)
        sine += s
        squares += angle * angle
        count++
      })
    }
    expect(Math.abs(sine / count)).toBeLessThan(0.03)
    // cos^2 spreading: variance pi^2/12 - 1/2 rad^2 (closed form).
    expect(Math.sqrt(squares / count)).toBeCloseTo(Math.sqrt(Math.PI ** 2 / 12 - 0.5), 1)
  })
})
