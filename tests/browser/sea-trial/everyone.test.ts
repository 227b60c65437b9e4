import AxeBuilder from '@axe-core/playwright'
import type { Page } from 'playwright-core'
import { describe, expect, inject } from 'vitest'
import { test } from '../browser'
import { open, verdictOf, windBox } from './page'

describe('for everyone', () => {
  test('a trial is set, played and taken back by keyboard alone', async ({ page }) => {
    await open(page)
    await tabTo(page, 'slider', 'Wind strength')
    const before = await windBox(page).inputValue()
    await page.keyboard.press('ArrowRight')
    expect(Number(await windBox(page).inputValue())).toBe(Number(before) + 0.5)
    await tabTo(page, 'button', 'Undo')
    await page.keyboard.press('Enter')
    expect(await windBox(page).inputValue()).toBe(before)
    await tabTo(page, 'button', 'Pause')
    await page.keyboard.press('Space')
    await page.getByRole('button', { name: 'Play' }).waitFor()
  })

  test.for(['light', 'dark', 'night'])(
    '%s is free of barriers that can be found by rule',
    async (theme, { page }) => {
      await open(page)
      await page.getByText('Light and units').click()
      await page.getByRole('combobox', { name: 'Light', exact: true }).selectOption(theme)
      await expect.poll(() => page.locator('html').getAttribute('data-theme')).toBe(theme)
      await page.getByRole('button', { name: 'Open all' }).click()
      const { violations } = await new AxeBuilder({ page }).analyze()
      const grave = violations.filter(({ impact }) => impact === 'serious' || impact === 'critical')
      expect(
        grave.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join('; ')}`),
      ).toEqual([])

      const html = await (await page.context().request.get(inject('baseUrl'))).text()
      expect(html).toContain(`data-theme="${theme}"`)
    },
  )

  test.for([390, 820])(
    '%d px wide nothing lies beyond the edge, and verdict and play stay in sight',
    async (width, { page }) => {
      await page.setViewportSize({ width, height: 844 })
      await open(page)
      const { scrollWidth, height } = await page.evaluate(() => ({
        scrollWidth: document.documentElement.scrollWidth,
        height: document.documentElement.scrollHeight,
      }))
      expect(scrollWidth).toBe(width)
      const verdict = await verdictOf(page)
      for (const y of [0, height / 3, height / 2]) {
        await page.evaluate((top) => window.scrollTo(0, top), y)
        await expect.poll(() => inSight(page, verdict)).toBe(true)
        await expect.poll(() => inSight(page, 'Pause')).toBe(true)
      }
    },
  )

  test('without JavaScript the page shows boat, setup and verdict, and another setup can be taken', async ({
    browser,
  }) => {
    const context = await browser.newContext({
      baseURL: inject('baseUrl'),
      javaScriptEnabled: false,
    })
    const page = await context.newPage()
    await page.goto('/')
    expect(await verdictOf(page)).not.toBe('')
    expect(await page.locator('.sheet svg path').count()).toBeGreaterThan(10)
    await page.locator('#setup').selectOption({ index: 1 })
    const chosen = await page.locator('#setup').inputValue()
    await page.getByRole('button', { name: 'Take this setup' }).click()
    expect(page.url()).toContain(`setup=${chosen}`)
    expect(await page.locator('#setup').inputValue()).toBe(chosen)
    expect(await verdictOf(page)).not.toBe('')
    await context.close()
  })
})

async function tabTo(page: Page, role: string, name: string) {
  const wanted = page.getByRole(role as 'button', { name, exact: true }).first()
  for (let presses = 0; presses < 120; presses++) {
    if (await wanted.evaluate((element) => element === document.activeElement)) return
    await page.keyboard.press('Tab')
  }
  throw new Error(`${name} cannot be reached with the Tab key`)
}

/** Whether a text can be seen in the window as it is scrolled. */
function inSight(page: Page, text: string): Promise<boolean> {
  return page.evaluate((wanted) => {
    const found = [...document.querySelectorAll('p, button')].filter(
      (element) => element.textContent?.trim() === wanted,
    )
    return found.some((element) => {
      const { top, bottom, height } = element.getBoundingClientRect()
      if (height === 0 || bottom <= 0 || top >= window.innerHeight) return false
      const middle = Math.min(Math.max((top + bottom) / 2, 1), window.innerHeight - 1)
      const { left, width } = element.getBoundingClientRect()
      const over = document.elementFromPoint(left + Math.min(width / 2, 40), middle)
      return over !== null && (element.contains(over) || over.contains(element))
    })
  }, text)
}
