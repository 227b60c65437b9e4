import type { Page } from 'playwright-core'
import { expect } from 'vitest'

/** Opens a sea trial and waits until this browser has computed its run. */
export async function open(page: Page, path = '/') {
  await page.goto(path)
  await settled(page)
}

export async function settled(page: Page) {
  await page.locator('main:not([data-computing])').waitFor({ timeout: 30_000 })
}

export const verdictOf = async (page: Page) =>
  (await page.locator('.verdict p').first().textContent()) ?? ''
export const metricsOf = (page: Page) => page.locator('.title dl').textContent()
export const clockOf = (page: Page) =>
  page.getByRole('slider', { name: 'Moment of the run' }).getAttribute('aria-valuetext')
export const tracesOf = (page: Page) =>
  page
    .locator('.strip svg[role="img"] path')
    .evaluateAll((paths) => paths.map((path) => path.getAttribute('d')).join(''))
export const windBox = (page: Page) => page.getByRole('textbox', { name: 'Wind strength' })
export const windRule = (page: Page) => page.getByRole('slider', { name: 'Wind strength' })

/** The address is written once a slider rests. */
export async function addressHas(page: Page, part: string | RegExp) {
  await expect.poll(() => page.url(), { timeout: 5000 }).toMatch(part)
}
