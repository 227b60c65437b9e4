import { describe, expect } from 'vitest'
import { test } from '../browser'
import { addressHas, clockOf, metricsOf, open, settled, tracesOf, windBox, windRule } from './page'

describe('adjusting', () => {
  test('a dragged slider redraws the run while it is held, and undo takes the drag back whole', async ({
    page,
  }) => {
    await open(page)
    const [value, metrics] = [await windBox(page).inputValue(), await metricsOf(page)]
    const traces = await tracesOf(page)
    const box = await windRule(page).boundingBox()
    if (!box) throw new Error('the slider is not drawn')
    const y = box.y + box.height / 2
    await page.mouse.move(box.x + box.width * 0.3, y)
    await page.mouse.down()
    for (let part = 0.35; part < 0.75; part += 0.05) {
      await page.mouse.move(box.x + box.width * part, y)
      await page.waitForTimeout(40)
    }
    await expect.poll(() => metricsOf(page), { timeout: 10_000 }).not.toBe(metrics)
    expect(await tracesOf(page)).not.toBe(traces)
    await page.mouse.up()
    await settled(page)
    expect(await windBox(page).inputValue()).not.toBe(value)

    await page.getByRole('button', { name: 'Undo', exact: true }).click()
    await settled(page)
    expect(await windBox(page).inputValue()).toBe(value)
    await expect.poll(() => metricsOf(page)).toBe(metrics)
    expect(await page.getByRole('button', { name: 'Undo', exact: true }).isDisabled()).toBe(true)
    await page.getByRole('button', { name: 'Redo' }).click()
    expect(await windBox(page).inputValue()).not.toBe(value)
  })

  test('the ten minutes are redrawn before a hand has moved on', async ({ page, annotate }) => {
    await open(page)
    await page.getByRole('button', { name: 'Pause' }).click()
    const tookMs = await page.evaluate(redrawTimesMs)
    const median = tookMs.toSorted((a, b) => a - b)[Math.floor(tookMs.length / 2)] ?? 0
    await annotate(
      `From a movement of the slider to the strip redrawn: ${Math.round(median)} ms, median`,
    )
    expect(median).toBeLessThan(1500)
  })

  test('a change leaves the cursor where it is', async ({ page }) => {
    await open(page)
    await page.getByRole('button', { name: 'Pause' }).click()
    await page.getByRole('slider', { name: 'Moment of the run' }).fill('200')
    await windBox(page).fill('14')
    await windBox(page).press('Enter')
    await settled(page)
    expect(await clockOf(page)).toMatch(/^3:20 of/)
  })

  test('an entry may name its unit, and one that will not do is answered beside it', async ({
    page,
  }) => {
    await open(page)
    await windBox(page).fill('6 m/s')
    await windBox(page).press('Enter')
    await expect.poll(() => windBox(page).inputValue()).toBe('11.663')
    await windBox(page).fill('5 kgf')
    await windBox(page).press('Enter')
    await page.getByText('“kgf” is not a speed here. Use kn, m/s, km/h or mph.').waitFor()
    await windBox(page).fill('60')
    await windBox(page).press('Enter')
    await page.getByText('Wind strength: between 2.0 and 35.0 kn.').waitFor()
    expect(await windBox(page).inputValue()).toBe('60')
  })

  test('units are chosen once and remembered', async ({ page }) => {
    await open(page)
    await page.getByText('Light and units').click()
    await page.getByRole('combobox', { name: 'Speeds' }).selectOption('m/s')
    await page.locator('.weather').getByText('m/s', { exact: true }).first().waitFor()
    await page.reload()
    await settled(page)
    await page.locator('.weather').getByText('m/s', { exact: true }).first().waitFor()
  })

  test('a part is adjusted by its note on the drawing', async ({ page }) => {
    await open(page)
    const note = page.locator('.gear').getByRole('button', { name: /Control line/ })
    await note.click()
    const box = page.locator('.gear').getByRole('textbox', { name: 'Line taken up' })
    await expect.poll(() => box.evaluate((it) => it === document.activeElement)).toBe(true)
    await box.fill('12.5 cm')
    await box.press('Enter')
    await expect.poll(() => note.textContent()).toContain('12.5')
    await box.press('Escape')
    expect(await note.getAttribute('aria-expanded')).toBe('false')
    await addressHas(page, 'li.tkUp_0.125')
  })
})

/** Moves the wind's slider ten times; how long each time until the strip has changed on the screen. */
async function redrawTimesMs(): Promise<number[]> {
  const strip = document.querySelector('.strip svg[role="img"]')
  const rule = document.querySelector<HTMLInputElement>('.weather input[type="range"]')
  const setValue = Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')?.set
  if (!strip || !rule || !setValue) throw new Error('no strip or no slider')
  const times: number[] = []
  for (let move = 1; move <= 10; move++) {
    const began = performance.now()
    const redrawn = new Promise<void>((resolve) => {
      const observer = new MutationObserver(() => {
        observer.disconnect()
        requestAnimationFrame(() => resolve())
      })
      observer.observe(strip, { attributes: true, childList: true, subtree: true })
    })
    setValue.call(rule, 8 + move / 2)
    rule.dispatchEvent(new Event('input', { bubbles: true }))
    await redrawn
    times.push(performance.now() - began)
    // The ghosts follow; the next movement is timed from rest.
    await new Promise((resolve) => setTimeout(resolve, 1500))
  }
  return times
}
