import { readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'

const css = readFileSync(new URL('../../../app/app.css', import.meta.url), 'utf8')

type Tokens = Record<string, string>

function themes(): Record<'light' | 'dark' | 'night', Tokens> {
  const light: Tokens = {}
  const dark: Tokens = {}
  for (const [, name = '', day = '', dusk = ''] of css.matchAll(
    /--([\w-]+): light-dark\((#[0-9a-f]{6}), (#[0-9a-f]{6})\);/g,
  )) {
    light[name] = day
    dark[name] = dusk
  }
  const block = css.match(/:root\[data-theme=.night.\] \{([^}]*)\}/)?.[1] ?? ''
  const night: Tokens = {}
  for (const [, name = '', red = ''] of block.matchAll(/--([\w-]+): (#[0-9a-f]{6});/g))
    night[name] = red
  return { light, dark, night }
}

/** Relative luminance and contrast ratio as WCAG 2.2 defines them. */
function luminance(colour: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const channel = Number.parseInt(colour.slice(at, at + 2), 16) / 255
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4
  })
  return 0.2126 * r + 0.7152 * g + 0.0722 * b
}

function contrast(a: string, b: string): number {
  const [dark = 0, light = 0] = [luminance(a), luminance(b)].sort((x, y) => x - y)
  return (light + 0.05) / (dark + 0.05)
}

const grounds = ['paper', 'cloth', 'deck', 'band'] as const
const words = ['ink', 'ink-soft', 'line', 'elastic', 'port', 'starboard'] as const
const strokes = ['ink-pale', 'line-pale', 'elastic-pale'] as const

const all = themes()

describe.each(Object.entries(all))('%s theme', (theme, tokens) => {
  test('defines every colour', () => {
    expect(Object.keys(tokens).sort()).toEqual([...grounds, ...words, ...strokes, 'hair'].sort())
  })

  test.each(grounds.flatMap((ground) => words.map((word) => [word, ground] as const)))(
    '%s can be read as text on %s',
    (word, ground) => {
      expect(contrast(tokens[word] ?? '', tokens[ground] ?? '')).toBeGreaterThanOrEqual(4.5)
    },
  )

  test.each(grounds.flatMap((ground) => strokes.map((stroke) => [stroke, ground] as const)))(
    '%s can be seen as a line on %s',
    (stroke, ground) => {
      expect(contrast(tokens[stroke] ?? '', tokens[ground] ?? '')).toBeGreaterThanOrEqual(3)
    },
  )

  test('docs/design.md states the contrast of every pair as computed', () => {
    const page = readFileSync(new URL('../../../docs/design.md', import.meta.url), 'utf8').replace(
      / +/g,
      ' ',
    )
    for (const ink of [...words, ...strokes]) {
      const row = grounds
        .map((ground) => contrast(tokens[ink] ?? '', tokens[ground] ?? '').toFixed(1))
        .join(' | ')
      expect(page, `${theme} ${ink}`).toContain(`| ${theme} | ${ink} | ${tokens[ink]} | ${row} |`)
    }
  })
})

test('the night theme is black and three strengths of red, nothing else', () => {
  const colours = new Set(Object.values(all.night))
  expect(colours.size).toBe(4)
  expect(colours).toContain('#000000')
  for (const colour of colours) {
    const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) =>
      Number.parseInt(colour.slice(at, at + 2), 16),
    )
    expect(Math.max(g, b)).toBeLessThanOrEqual(r / 4)
  }
})

test('the scale of type rises by a quarter from 14 px in five sizes', () => {
  const sizes = [...css.matchAll(/--text-\w+: ([\d.]+)rem;/g)].map((match) => Number(match[1]) * 16)
  expect(sizes).toHaveLength(5)
  expect(sizes[0]).toBe(14)
  sizes.slice(1).forEach((size, index) => {
    expect(size / (sizes[index] ?? 1)).toBeCloseTo(1.25, 2)
  })
})
