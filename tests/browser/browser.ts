import { type Browser, type ConsoleMessage, chromium, type Page } from 'playwright-core'
import { test as base, expect, inject } from 'vitest'

interface Fixtures {
  browser: Browser
  /** A page of a new visitor; the test fails when it logs an error or throws. */
  page: Page
  /** Console errors that the test at hand provokes, and so expects. */
  expectedFaults: RegExp[]
}

export const test = base.extend<Fixtures>({
  browser: [
    // biome-ignore lint/correctness/noEmptyPattern: vitest reads a fixture's needs from its pattern
    async ({}, use) => {
      const browser = await chromium.launch({
        executablePath: process.env.CHROMIUM || '/usr/bin/chromium',
        args: [
          '--no-sandbox',
          '--disable-gpu',
          '--disable-quic',
          '--no-first-run',
          '--disable-background-networking',
          '--disable-component-update',
          '--disable-sync',
        ],
      })
      await use(browser)
      await browser.close()
    },
    { scope: 'worker' },
  ],
  // biome-ignore lint/correctness/noEmptyPattern: vitest reads a fixture's needs from its pattern
  expectedFaults: async ({}, use) => use([]),
  page: async ({ browser, expectedFaults }, use) => {
    const context = await browser.newContext({
      baseURL: inject('baseUrl'),
      viewport: { width: 1440, height: 900 },
    })
    const page = await context.newPage()
    const faults: string[] = []
    page.on('pageerror', (error) => faults.push(`thrown: ${error.stack ?? error.message}`))
    page.on('console', (message) => {
      if (message.type() === 'error') faults.push(described(message))
    })
    await use(page)
    await context.close()
    const unexpected = faults.filter((fault) => !expectedFaults.some((each) => each.test(fault)))
    expect(unexpected, 'errors in the page').toEqual([])
  },
})

function described(message: ConsoleMessage): string {
  return `logged: ${message.text()} (${message.location().url})`
}
