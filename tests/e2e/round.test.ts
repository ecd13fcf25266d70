import type { Browser, BrowserContext, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { DEMO_PASSWORD } from '../../seeds/demo/people.ts'
import { expectAccessible, keepScreen, launchBrowser } from '../support/browser.ts'
import { RunningServer } from '../support/running-server.ts'

/* The built application with its database file, mail and card fakes, in Debian's Chromium, as each role. */

const server = new RunningServer()
let browser: Browser
beforeAll(async () => {
  await server.start()
  browser = await launchBrowser()
})
afterAll(async () => {
  await browser?.close()
  await server.stop()
})

const WIDE = { width: 1440, height: 900 }
const PHONE = { width: 390, height: 844 }

async function visitor(): Promise<Page> {
  const context: BrowserContext = await browser.newContext({ viewport: WIDE, baseURL: server.url })
  const page = await context.newPage()
  page.on('pageerror', (error) => {
    throw error
  })
  return page
}

async function signedIn(name: string): Promise<Page> {
  const page = await visitor()
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill(`${name}@plumbrule.example`)
  await page.getByLabel('Password').fill(DEMO_PASSWORD)
  await page.locator('form').getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL((url) => url.pathname !== '/sign-in')
  return page
}

/** The page as it stands: pictures at both widths, and axe by day and by night. */
async function look(page: Page, name: string): Promise<void> {
  for (const [size, viewport] of Object.entries({ wide: WIDE, phone: PHONE })) {
    await page.setViewportSize(viewport)
    await page.waitForTimeout(250)
    await keepScreen(page, `${name}-${size}`)
    const overflow = await page.evaluate('document.documentElement.scrollWidth - window.innerWidth')
    expect(overflow, `${name} at ${viewport.width} px scrolls sideways`).toBeLessThanOrEqual(0)
  }
  await page.setViewportSize(WIDE)
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' })
    await page.waitForTimeout(150)
    await expectAccessible(page, `${name}, ${colorScheme}`)
  }
  await page.emulateMedia({ colorScheme: 'light', reducedMotion: null })
}

interface Letter {
  subject: string
  to: string
  text: string
  attachments: { fileName: string; url: string }[]
}

async function letter(subject: RegExp): Promise<Letter> {
  for (let tries = 0; tries < 100; tries += 1) {
    const list = (await (await fetch(`${server.mailboxUrl}/letters.json`)).json()) as {
      id: string
      subject: string
    }[]
    const found = list.find((one) => subject.test(one.subject))
    if (found) return (await (await fetch(`${server.mailboxUrl}/letters/${found.id}.json`)).json()) as Letter
    await new Promise((resolve) => setTimeout(resolve, 100))
  }
  throw new Error(`no letter ${subject} in 10 s`)
}

describe('the round', () => {
  let contractor: Page
  let estimator: Page
  let requestUrl = ''
  let orderUrl = ''

  it('a contractor describes a column on its drawing, and shape and price answer', async () => {
    contractor = await signedIn('contractor')
    await look(contractor, '01-requests-empty')
    await contractor.goto('/requests/new')
    await contractor.getByLabel('Height', { exact: true }).fill('6000')
    await contractor.getByLabel('Dead', { exact: true }).fill('180')
    await contractor.getByLabel('Live', { exact: true }).fill('260')
    await contractor.getByRole('button', { name: /add a brace/i }).click()
    const shape = contractor.getByRole('heading', { name: 'Price' })
    await shape.waitFor()
    await expect.poll(() => contractor.getByText(/W6X\d+|HSS|W8X\d+/).count()).toBeGreaterThan(0)
    await contractor.getByLabel('How many').fill('4')
    await contractor.getByLabel('Job').fill('Ferry hall, north wing')
    await contractor.getByLabel('Ship to').fill('3 Quay Road, Easthaven')
    await contractor.getByLabel('Tax region').click()
    await contractor.getByRole('option', { name: 'Eastmark' }).click()
    await contractor.getByLabel('Road from the shop').fill('60')
    await contractor.waitForTimeout(600)
    await look(contractor, '02-new-request')
    await contractor.getByRole('button', { name: 'Save as a draft' }).click()
    await contractor.waitForURL(/\/requests\/[0-9a-f-]{36}\/edit/)
    await contractor.getByRole('button', { name: 'Ask for a firm quote' }).click()
    await contractor.waitForURL(/\/requests\/[0-9a-f-]{36}$/)
    requestUrl = contractor.url()
    await contractor.getByText('submitted', { exact: true }).first().waitFor()
    await look(contractor, '03-request')
    await letter(/We have your request R-1001/)
  })

  it('another company does not find it', async () => {
    const other = await signedIn('other')
    await other.goto(requestUrl)
    await other
      .getByText(/not yours to see|no such request/i)
      .first()
      .waitFor()
    await other.context().close()
  })

  it('the estimator finds it on the desk, changes it on the bench, cannot approve what does not hold, approves and sends', async () => {
    estimator = await signedIn('estimator')
    await estimator.goto('/desk')
    await estimator.getByText('R-1001').waitFor()
    await look(estimator, '04-desk')
    await estimator.getByRole('button', { name: 'Take it up' }).click()
    await estimator.waitForURL(/\/bench\//)
    const approve = estimator.getByRole('button', { name: 'Approve revision A' })
    await approve.waitFor()
    await look(estimator, '05-bench')
    const section = estimator.getByLabel('Section', { exact: true })
    await section.fill('W4X13')
    await section.press('Enter')
    await section.press('Tab')
    await estimator.getByRole('button', { name: 'Keep', exact: true }).click()
    await estimator
      .getByText(/A1 does not hold/)
      .first()
      .waitFor()
    expect(await approve.isDisabled()).toBe(true)
    await keepScreen(estimator, '06-bench-fails-wide')
    // Another of what would do is taken with its plates, and priced as it goes.
    await estimator.getByRole('button', { name: /^take/i }).first().click()
    await estimator.getByRole('button', { name: 'Keep', exact: true }).click()
    await expect.poll(() => approve.isEnabled()).toBe(true)
    await approve.click()
    await estimator.getByRole('button', { name: 'Send revision A' }).click()
    await estimator.getByRole('button', { name: 'Send it' }).click()
    await estimator
      .getByText(/price holds until/)
      .first()
      .waitFor()
    await look(estimator, '07-bench-sent')
  })

  it('the quote goes out by e-mail with its document and a private link', async () => {
    const { to, text, attachments } = await letter(/^Quote Q-1001 A/)
    expect(to).toBe('contractor@plumbrule.example')
    expect(attachments.map(({ fileName }) => fileName)).toEqual(['Q-1001 A.pdf'])
    const pdf = Buffer.from(await (await fetch(`${server.mailboxUrl}${attachments[0]?.url}`)).arrayBuffer())
    expect(pdf.subarray(0, 5).toString()).toBe('%PDF-')
    expect(text).not.toMatch(/margin|cost/i)
    const mailbox = await visitor()
    await mailbox.goto(server.mailboxUrl)
    await mailbox.getByRole('link', { name: /^Quote Q-1001 A/ }).click()
    await mailbox.getByRole('heading', { name: /^Quote Q-1001 A/ }).waitFor()
    await keepScreen(mailbox, '08-mail-wide')
    await mailbox.context().close()
    const link = /\S+\/q#\S+/.exec(text)?.[0] ?? ''
    const stranger = await visitor()
    await stranger.goto(link)
    await stranger.getByRole('heading', { name: 'Ferry hall, north wing' }).waitFor()
    await look(stranger, '09-quote-by-link')
    expect(await stranger.content()).not.toMatch(/margin/i)
    await stranger.context().close()
  })

  it('the contractor reads the cautions, accepts under own name, and pays: declined first, then through', async () => {
    await contractor.goto(requestUrl)
    await contractor
      .getByRole('link', { name: /Q-1001/ })
      .first()
      .click()
    await contractor.waitForURL(/\/quotes\//)
    const accept = contractor.getByRole('button', { name: 'Accept revision A' })
    await accept.click()
    await contractor.getByText('confirm the cautions above before you accept').waitFor()
    await contractor.getByLabel('Your name').fill('Maren Tessell')
    await contractor.getByText(/I have read the cautions/).click()
    await look(contractor, '10-quote')
    await accept.click()
    await contractor.waitForURL(/\/orders\//)
    orderUrl = contractor.url()
    await look(contractor, '11-order-due')
    await contractor.getByRole('button', { name: 'Pay the deposit by card' }).click()
    await contractor.waitForURL(/\/pay\//)
    await look(contractor, '12-card-page')
    await contractor.getByRole('button', { name: 'The bank declines it' }).click()
    await contractor.getByText('Your card was declined.').waitFor()
    await contractor.getByRole('link', { name: 'Leave without paying' }).click()
    await contractor.waitForURL(/\/orders\//)
    await contractor.getByText(/did not go through/).waitFor()
    await keepScreen(contractor, '13-order-declined-wide')
    await contractor.getByRole('button', { name: 'Pay the deposit again' }).click()
    await contractor.waitForURL(/\/pay\//)
    await contractor.getByRole('button', { name: 'The card goes through' }).click()
    await contractor.waitForURL(/\/orders\//)
    await contractor.getByText('released', { exact: true }).first().waitFor()
    await look(contractor, '14-order-released')
    await letter(/^Receipt: deposit for order O-1001/)
    await letter(/did not go through/)
  })

  it('accounts sees the deposit held and a ledger that balances, and takes it as CSV', async () => {
    const accounts = await signedIn('accounts')
    await accounts.goto('/accounts')
    await accounts.getByText('O-1001').first().waitFor()
    await look(accounts, '15-accounts')
    await accounts.goto('/ledger')
    await accounts
      .getByText(/customer deposits/)
      .first()
      .waitFor()
    await look(accounts, '16-ledger')
    const download = accounts.waitForEvent('download')
    await accounts.getByRole('button', { name: 'Download all as CSV' }).click()
    expect((await download).suggestedFilename()).toMatch(/^ledger.*\.csv$/)
    await accounts.context().close()
  })

  it('admin sees people, the price book and the audit trail', async () => {
    const admin = await signedIn('admin')
    for (const [place, text] of [
      ['/people', 'Idris Vane'],
      ['/price-book', 'Shop rate'],
      ['/audit', /deposit received/],
      ['/sections', 'W4X13'],
    ] as const) {
      await admin.goto(place)
      await admin.getByText(text).first().waitFor()
      await look(admin, `17${place.replace('/', '-')}`)
    }
    await admin.context().close()
  })

  it('a second start keeps it all', async () => {
    await server.end('SIGTERM')
    await server.start()
    await contractor.goto(orderUrl)
    await contractor.getByText('released', { exact: true }).first().waitFor()
  })
})
