import { describe, expect } from 'vitest'
import { test } from '../browser'
import { open } from './page'

describe('how far to trust a run', () => {
  test('ten seeds are sailed', async ({ page }) => {
    await open(page)
    const trust = page.getByRole('region', { name: 'How far to trust this run' })
    await trust.getByRole('button', { name: 'Sail 10 seeds' }).click()
    await trust.getByText(/Holds in \d+ of 10/).waitFor({ timeout: 60_000 })
  })

  test('this browser and the server come to the same run, to the last figure, for every setup', async ({
    page,
  }) => {
    await open(page)
    const ids = await page
      .locator('#setup option')
      .evaluateAll((options) => options.map((option) => (option as HTMLOptionElement).value))
    expect(ids.length).toBeGreaterThan(1)
    for (const id of ids) {
      await open(page, `/?setup=${id}`)
      const trust = page.getByRole('region', { name: 'How far to trust this run' })
      await trust.getByRole('button', { name: 'Compare with the server' }).click()
      const answer = trust.getByText(/the server’s run/)
      await answer.waitFor({ timeout: 30_000 })
      expect(`${id}: ${await answer.textContent()}`).toBe(
        `${id}: To the last figure the same as the server’s run.`,
      )
    }
  })

  test('a long job can be broken off', async ({ page }) => {
    await open(page)
    const trust = page.getByRole('region', { name: 'How far to trust this run' })
    await trust.getByRole('button', { name: 'Compare with the adaptive solver' }).click()
    await trust.getByRole('button', { name: 'Break off' }).click()
    await trust.getByRole('button', { name: 'Compare with the adaptive solver' }).waitFor()
  })
})
