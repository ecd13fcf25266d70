import express from 'express'
import { createServer } from 'node:http'
import type { Logger } from 'pino'
import { operations } from '../../../shared/contracts/operations.ts'
import type { Config } from '../../config.ts'
import { startJobs } from '../../jobs/scheduler.ts'
import { listen, type Running } from '../../listen.ts'
import { createStripe } from '../stripe-client.ts'
import { cardApi } from './card-api.ts'
import { CardFake } from './card-fake.ts'
import { cardPage } from './card-page.ts'
import { deliverDueEvents } from './deliver-events.ts'

/** The local fake of the card processor: its API, its hosted page, its signed events. Never outside demo mode. */
export async function startCardFake(config: Config, logger: Logger): Promise<Running & { fake: CardFake }> {
  const { secretKey, webhookSecret, fakeUrl } = config.stripe
  if (config.mode !== 'demo' || fakeUrl === undefined) throw new Error('the card fake is for the demo alone')
  const fake = new CardFake(config.dataDir)
  const app = express()
  app.disable('x-powered-by')
  app.use('/v1', cardApi(fake, secretKey, fakeUrl))
  app.use(cardPage(fake))
  const server = await listen(createServer(app), Number(new URL(fakeUrl).port), config.host)
  const delivery = {
    ...{ fake, logger, secret: webhookSecret, pageUrl: fakeUrl, stripe: createStripe(config) },
    // The desk on this machine, whatever name the public has for it.
    to: `http://127.0.0.1:${config.port}${operations.receiveStripeEvent.path}`,
  }
  const jobs = startJobs(
    [{ name: 'fake events', everyMs: 300, run: () => deliverDueEvents(delivery) }],
    logger,
  )
  return {
    fake,
    async stop() {
      await jobs.stop()
      await server.stop()
    },
  }
}
