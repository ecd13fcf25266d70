import type { Logger } from 'pino'
import type { Config } from './config.ts'
import type { Running } from './listen.ts'
import { startMailFake } from './mail/fake/start-mail-fake.ts'
import { startCardFake } from './payments/fake/start-card-fake.ts'

/** What stands in for hosted services in the demo. */
export async function startFakes(config: Config, logger: Logger): Promise<Running> {
  const running = [await startMailFake(config, logger), await startCardFake(config, logger)]
  return {
    async stop() {
      await Promise.all(running.map((one) => one.stop()))
    },
  }
}
