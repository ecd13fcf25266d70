import Stripe from 'stripe'
import type { Config } from '../config.ts'

/** The processor's own SDK; in demo mode pointed at the local fake. */
export function createStripe({ stripe: { secretKey, fakeUrl } }: Pick<Config, 'stripe'>): Stripe {
  const common = { timeout: 10_000, maxNetworkRetries: 2, telemetry: false }
  if (!fakeUrl) return new Stripe(secretKey, common)
  const { hostname, port } = new URL(fakeUrl)
  return new Stripe(secretKey, { ...common, host: hostname, port, protocol: 'http' })
}
