import { describe, expect } from 'vitest'
import { test } from '../browser'
import { clockOf, open, settled, verdictOf } from './page'

describe('the page as it opens', () => {
  test('something sails without a click', async ({ page }) => {
    await open(page)
    const turned = () => page.locator('.sheet svg').first().innerHTML()
    const [drawn, at] = [await turned(), await clockOf(page)]
    await expect.poll(() => clockOf(page)).not.toBe(at)
    expect(await turned()).not.toBe(drawn)
    expect(await page.title()).toContain('Sea trial · Counterhelm')
  })

  test('this browser comes to the verdict the server gave', async ({ page }) => {
    await page.goto('/')
    const verdict = await verdictOf(page)
    await settled(page)
    expect(await verdictOf(page)).toBe(verdict)
  })

  test('nothing shifts while it plays', async ({ page }) => {
    await open(page)
    await page.getByRole('combobox', { name: 'Speed', exact: true }).selectOption('60')
    const shift = await page.evaluate(
      () =>
        new Promise<number>((resolve) => {
          let sum = 0
          new PerformanceObserver((list) => {
            for (const entry of list.getEntries()) {
              sum += (entry as PerformanceEntry & { value: number }).value
            }
          }).observe({ type: 'layout-shift' })
          setTimeout(() => resolve(sum), 4000)
        }),
    )
    expect(shift).toBe(0)
  })

  test('with reduced motion the run waits to be played', async ({ page }) => {
    await page.emulateMedia({ reducedMotion: 'reduce' })
    await open(page)
    expect(await clockOf(page)).toMatch(/^0:00 of/)
    await page.getByRole('button', { name: 'Play' }).click()
    await expect.poll(() => clockOf(page)).not.toMatch(/^0:00 of/)
  })
})
