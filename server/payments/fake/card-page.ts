import express, { Router } from 'express'
import { z } from 'zod'
import { fakePage } from '../../fake-page.ts'
import { escapeHtml } from '../../html.ts'
import { moneyText } from '../../money-and-dates.ts'
import type { CardFake } from './card-fake.ts'
import type { CardSession } from './card-store.ts'

const choice = z.object({ outcome: z.enum(['accept', 'decline', 'no funds']) })

function amountText({ amount, currency }: CardSession): string {
  return moneyText({ amount, currency: currency.toUpperCase() })
}

function bodyOf(session: CardSession): string {
  const { description, failure, id } = session
  return `<h1>Practice card page</h1>
<p class="quiet">This stands in for the card processor. No card is asked for and no money moves.</p>
${failure === null ? '' : `<p class="bad" role="alert">${escapeHtml(failure)} Try again or leave.</p>`}
<dl><dt>For</dt><dd>${escapeHtml(description)}</dd><dt>Amount</dt><dd>${escapeHtml(amountText(session))}</dd></dl>
<form method="post">
<button class="first" name="outcome" value="accept">The card goes through</button>
<button name="outcome" value="decline">The bank declines it</button>
<button name="outcome" value="no funds">Not enough money on it</button>
</form>
<p><a href="/pay/${escapeHtml(id)}/leave">Leave without paying</a></p>`
}

/** The hosted page, of our own drawing: what a payer can do to a checkout. */
export function cardPage(fake: CardFake): Router {
  const router = Router()
  router.use(express.urlencoded({ extended: false, limit: '10kb' }))
  router.get('/', (_req, res) => {
    const open = Object.values(fake.store.state.sessions).filter(({ status }) => status === 'open')
    const items = open.map(
      (one) =>
        `<li><a href="/pay/${one.id}">${escapeHtml(one.description)}, ${escapeHtml(amountText(one))}</a></li>`,
    )
    const list = items.length > 0 ? `<ul>${items.join('')}</ul>` : '<p>No checkout is open.</p>'
    res.send(fakePage('Practice card page', `<h1>Practice card page</h1>${list}`))
  })
  router.get('/pay/:id', (req, res) => {
    const session = fake.session(req.params.id)
    if (session?.status === 'open') return void res.send(fakePage('Practice card page', bodyOf(session)))
    const words = session ? 'This checkout is closed.' : 'There is no such checkout.'
    return void res.status(session ? 200 : 404).send(fakePage('Practice card page', `<h1>${words}</h1>`))
  })
  router.post('/pay/:id', (req, res) => {
    const parsed = choice.safeParse(req.body)
    const session = parsed.success ? fake.pay(req.params.id, parsed.data.outcome) : undefined
    if (!session) return void res.status(404).send(fakePage('Practice card page', '<h1>Not possible</h1>'))
    return void res.redirect(303, session.status === 'complete' ? session.successUrl : `/pay/${session.id}`)
  })
  router.get('/pay/:id/leave', (req, res) => {
    const session = fake.session(req.params.id)
    if (!session)
      return void res.status(404).send(fakePage('Practice card page', '<h1>No such checkout</h1>'))
    return void res.redirect(303, session.cancelUrl)
  })
  return router
}
