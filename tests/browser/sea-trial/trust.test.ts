import { describe } from 'vitest'
import { test } from '../browser'
import { open } from './page'

describe('how far to trust a run', () => {
  test('ten seeds are sailed, and the server’s run is compared with this browser’s', async ({
    page,
  }) => {
    await open(page)
    const trust = page.getByRole('region', { name: 'How far to trust this run' })
    await trust.getByRole('button', { name: 'Sail 10 seeds' }).click()
    await trust.getByText(/Holds in \d+ of 10/).waitFor({ timeout: 60_000 })
    await trust.getByRole('button', { name: 'Compare with the server' }).click()
    await trust
      .getByText(/At most [\d.]+° of course, .* from the server’s run/)
      .waitFor({ timeout: 30_000 })
  })

  test('a long job can be broken off', async ({ page }) => {
    await open(page)
    const trust = page.getByRole('region', { name: 'How far to trust this run' })
    await trust.getByRole('button', { name: 'Compare with the adaptive solver' }).click()
    await trust.getByRole('button', { name: 'Break off' }).click()
    await trust.getByRole('button', { name: 'Compare with the adaptive solver' }).waitFor()
  })
})
