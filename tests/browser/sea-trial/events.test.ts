import { describe } from 'vitest'
import { test } from '../browser'
import { addressHas, open } from './page'

describe('events', () => {
  test('are dropped by touching the strip, altered and taken out', async ({ page }) => {
    await open(page)
    await page.getByRole('button', { name: 'Gust', exact: true }).click()
    const strip = page.locator('.strip svg[role="img"]')
    await strip.scrollIntoViewIfNeeded()
    const box = await strip.boundingBox()
    if (!box) throw new Error('the strip is not drawn')
    await page.mouse.click(box.x + box.width * 0.4, box.y + box.height / 2)
    const events = page.getByRole('region', { name: 'Dropped into the run' })
    await events.getByText(/Gust of 6.0 kn for 20 s/).waitFor()
    await events.getByRole('textbox', { name: 'Stronger by' }).fill('9 kn')
    await events.getByRole('textbox', { name: 'Stronger by' }).press('Enter')
    await events.getByText(/Gust of 9.0 kn/).waitFor()
    await addressHas(page, /gust_\d+_9_20/)
    await events.getByRole('button', { name: /Take out/ }).click()
    await events.waitFor({ state: 'detached' })
  })

  test('are dropped at the cursor with the keyboard', async ({ page }) => {
    await open(page)
    await page.getByRole('button', { name: 'Pause' }).press('Enter')
    await page.getByRole('slider', { name: 'Moment of the run' }).fill('150')
    await page.getByRole('button', { name: 'Wind shift' }).press('Enter')
    await page.getByRole('button', { name: 'drop it at 2:30' }).press('Enter')
    await addressHas(page, 'wind-shift_150_15_30')
  })
})
