import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { mkdir } from 'node:fs/promises'
import { dirname } from 'node:path'
import { fileURLToPath } from 'node:url'
import { chromium, type Browser, type Page } from 'playwright-core'
import { expect } from 'vitest'

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8')
const screens = fileURLToPath(new URL('../e2e/screens/', import.meta.url))

/** Debian's Chromium, without the services that look for a network. */
export function launchBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
      '--no-first-run',
    ],
  })
}

interface AxeResult {
  violations: { id: string; nodes: { target: string[]; failureSummary?: string }[] }[]
}

/** No violation of axe-core's rules on the page as it stands. */
export async function expectAccessible(page: Page, where: string): Promise<void> {
  // Evaluated by the debugger, so the page's own content security policy stays as it is.
  await page.evaluate(axeSource)
  const result = (await page.evaluate('axe.run({ resultTypes: ["violations"] })')) as AxeResult
  const found = result.violations.flatMap(({ id, nodes }) =>
    nodes.map((node) => `${id}: ${node.target.join(' ')} ${node.failureSummary ?? ''}`),
  )
  expect(found, where).toEqual([])
}

/** Keeps a picture for the eye in tests/e2e/screens (not tracked). */
export async function keepScreen(page: Page, name: string): Promise<void> {
  const path = `${screens}${name}.png`
  await mkdir(dirname(path), { recursive: true })
  await page.screenshot({ path, fullPage: true })
}
