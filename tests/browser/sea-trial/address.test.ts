import type { Page } from 'playwright-core'
import { describe, expect } from 'vitest'
import { test } from '../browser'
import { addressHas, metricsOf, open, settled, verdictOf, windBox } from './page'

describe('the address', () => {
  test('of a copied link brings back the same run to the last figure', async ({
    page,
    browser,
  }) => {
    await page.context().grantPermissions(['clipboard-read', 'clipboard-write'])
    await open(page)
    await windBox(page).fill('13.3')
    await windBox(page).press('Enter')
    await page.getByRole('button', { name: 'Reef', exact: true }).click()
    await page.getByRole('button', { name: /drop it at/ }).click()
    await settled(page)
    await page.getByRole('button', { name: 'Copy link' }).click()
    await page.getByText('Link copied.').waitFor()
    const link = await page.evaluate(() => navigator.clipboard.readText())

    const context = await browser.newContext({ viewport: { width: 1440, height: 900 } })
    const other = await context.newPage()
    await open(other, link)
    expect(await savedTraces(other)).toBe(await savedTraces(page))
    expect(await metricsOf(other)).toBe(await metricsOf(page))
    await context.close()
  })

  test('that cannot be read in full is answered by name, and the rest holds', async ({ page }) => {
    await open(page)
    const setup = await page.locator('#setup').inputValue()
    await open(page, `/?setup=${setup}&trial=1~0.0.1~co.trWndSpdKn_14~li.tkUp_99~zz_1`)
    const remarks = page.getByRole('status').first()
    expect(await remarks.textContent()).toMatch(/made with model 0\.0\.1/)
    expect(await remarks.textContent()).toMatch(/Line taken up must be from -0\.5 to 1\.8 m/)
    expect(await remarks.textContent()).toMatch(/“zz_1”, which this boat and setup do not have/)
    expect(await windBox(page).inputValue()).toBe('14.0')
  })

  test('follows the choice of a setup, back and forward', async ({ page }) => {
    await open(page)
    const [first, other] = await page
      .locator('#setup option')
      .evaluateAll((options) => options.map((option) => (option as HTMLOptionElement).value))
    if (first === undefined || other === undefined) throw new Error('fewer than two setups')
    const chosen = (await page.locator('#setup').inputValue()) === first ? other : first
    await page.locator('#setup').selectOption(chosen)
    await addressHas(page, `setup=${chosen}`)
    await settled(page)
    await page.goBack()
    await expect.poll(() => page.locator('#setup').inputValue()).not.toBe(chosen)
    await page.goForward()
    await expect.poll(() => page.locator('#setup').inputValue()).toBe(chosen)
  })
})

const lost = test.extend({
  // biome-ignore lint/correctness/noEmptyPattern: vitest reads a fixture's needs from its pattern
  expectedFaults: async ({}, use) => use([/status of 404/]),
})

lost('an unknown setup is named, and another is shown in its place', async ({ page }) => {
  const response = await page.goto('/?setup=no-such-thing')
  expect(response?.status()).toBe(404)
  await page.getByText(/No setup is called “no-such-thing”/).waitFor()
  await settled(page)
  expect(await verdictOf(page)).not.toBe('')
})

lost('an unknown page says so and leads back', async ({ page }) => {
  await page.goto('/no-such-page')
  await page.getByRole('heading', { name: 'No such page' }).waitFor()
  await page.getByRole('link', { name: 'Go to the sea trial' }).click()
  await settled(page)
})

async function savedTraces(page: Page): Promise<string> {
  const download = page.waitForEvent('download')
  await page.getByRole('button', { name: 'Save traces (CSV)' }).click()
  const chunks: Buffer[] = []
  for await (const chunk of await (await download).createReadStream()) chunks.push(chunk as Buffer)
  return Buffer.concat(chunks).toString()
}
