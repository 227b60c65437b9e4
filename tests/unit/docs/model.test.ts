import { readFileSync } from 'node:fs'
import { judgingParameters } from 'sim/parameters/judging'
import { describe, expect, test } from 'vitest'
import { parameterTables, typeset, withParameters } from '../../../scripts/docs/parameters'

const page = readFileSync('docs/model.md', 'utf8')

describe('the page on the model', () => {
  test('has the parameter tables as they are now', () => {
    // When this fails: npm run docs
    expect(withParameters(page)).toBe(page)
  })

  test('closes every formula it opens', () => {
    const displays = page.split('$$')
    expect(displays.length % 2).toBe(1)
    for (const [i, part] of displays.entries()) {
      if (i % 2 === 1) {
        let depth = 0
        for (const sign of part.replaceAll(/\\[{}]/g, '')) {
          depth += sign === '{' ? 1 : sign === '}' ? -1 : 0
          expect(depth).toBeGreaterThanOrEqual(0)
        }
        expect([part, depth]).toEqual([part, 0])
        continue
      }
      for (const line of part.split('\n')) {
        expect([line, (line.match(/\$/g) ?? []).length % 2]).toEqual([line, 0])
      }
    }
  })

  test('says of a run that holds what the judging table says', () => {
    const { bandDeg, withinShare, leastSpeedShare, broachHeelDeg, broachErrorDeg } =
      judgingParameters
    const told = page.slice(page.indexOf('"Holds" is a definition'), page.indexOf('## 12'))
    expect(told).toContain(`within ${bandDeg.default} degrees of its own average`)
    expect(told).toContain(`${100 * withinShare.default} % of the time`)
    expect(told).toContain(`${String(leastSpeedShare.default).slice(1)} of the balance speed`)
    expect(told).toContain(`heel above ${broachHeelDeg.default} degrees`)
    expect(told).toContain(`more than ${broachErrorDeg.default} degrees off course`)
  })
})

describe('symbols of the tables', () => {
  test.each([
    ['m', '$m$'],
    ['GM', '$\\mathrm{GM}$'],
    ['U10', '$U_{10}$'],
    ['T_p', '$T_{p}$'],
    ['L_OA', '$L_{\\mathrm{OA}}$'],
    ['phi_v', '$\\phi_{v}$'],
    ['zeta_phi', '$\\zeta_{\\phi}$'],
    ['k_zz/L', '$k_{\\mathrm{zz}}/L$'],
    ['f/c', '$f/c$'],
  ])('%s', (symbol, mathematics) => {
    expect(typeset(symbol)).toBe(mathematics)
  })

  test('each is in a table', () => {
    expect(parameterTables()).toContain('$\\Lambda_{k}$')
    expect(parameterTables()).toContain('$\\delta_{\\mathrm{max}}$')
  })
})
