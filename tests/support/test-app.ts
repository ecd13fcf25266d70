import type { Express } from 'express'
import { createServer } from 'node:http'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import supertest from 'supertest'
import { DEMO_PASSWORD } from '../../seeds/demo/people.ts'
import { createApp } from '../../server/app.ts'
import { readConfig } from '../../server/config.ts'
import { closeDeps, createDeps } from '../../server/create-deps.ts'
import { startFakes } from '../../server/fakes.ts'
import { listen } from '../../server/listen.ts'
import { migrate } from '../../server/db/migrate.ts'
import type { Deps } from '../../server/deps.ts'
import { seed } from '../../server/seed.ts'
import { freePorts } from './free-ports.ts'

export type Agent = ReturnType<typeof supertest.agent>
export type DemoName = 'contractor' | 'estimator' | 'accounts' | 'admin' | 'other'

export interface TestApp {
  app: Express
  deps: Deps
  /** Moves the application's clock. */
  setClock: (instant: string) => void
  /** Signs a demo person in; the agent asks as our own pages do. */
  signIn: (name: DemoName) => Promise<Agent>
  /** An agent that nobody is signed in with. */
  stranger: () => Agent
  stop: () => Promise<void>
}

/** First instant of a test's clock, unless it says otherwise. */
export const START = '2026-03-02T09:00:00.000Z'

/**
 * The real application on a folder and a database file of its own. `outside`: with the fakes of mail and cards beside
 * it, and listening, so that they reach it; time is then the machine's.
 */
export async function startTestApp(options: { outside?: boolean } = {}): Promise<TestApp> {
  const dataDir = mkdtempSync(join(tmpdir(), 'plumbrule-test-'))
  const port = await freePorts()
  const config = readConfig({ DATA_DIR: dataDir, LOG_LEVEL: 'error', PORT: String(port) })
  let offset = options.outside ? 0 : Date.parse(START) - Date.now()
  const deps = createDeps(config, () => new Date(Date.now() + offset))
  await migrate(deps.db)
  await seed(deps)
  const app = createApp(deps)
  const outside = options.outside
    ? [await startFakes(config, deps.logger), await listen(createServer(app), port, config.host)]
    : []
  const stranger = () => supertest.agent(app).set('Sec-Fetch-Site', 'same-origin')
  return {
    app,
    deps,
    stranger,
    setClock(instant) {
      offset = Date.parse(instant) - Date.now()
    },
    async signIn(name) {
      const agent = stranger()
      const email = `${name}@plumbrule.example`
      await agent.post('/api/session').send({ email, password: DEMO_PASSWORD }).expect(201)
      return agent
    },
    async stop() {
      await Promise.all(outside.map((one) => one.stop()))
      await closeDeps(deps)
      rmSync(dataDir, { recursive: true, force: true })
    },
  }
}
