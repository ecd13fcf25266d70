import type { Express } from 'express'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import supertest from 'supertest'
import { DEMO_PASSWORD } from '../../seeds/demo/people.ts'
import { createApp } from '../../server/app.ts'
import { readConfig } from '../../server/config.ts'
import { closeDeps, createDeps } from '../../server/create-deps.ts'
import { migrate } from '../../server/db/migrate.ts'
import type { Deps } from '../../server/deps.ts'
import { seed } from '../../server/seed.ts'

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

/** The real application on a folder and a database file of its own, without the network's outside. */
export async function startTestApp(options: { port?: number; dataDir?: string } = {}): Promise<TestApp> {
  const dataDir = options.dataDir ?? mkdtempSync(join(tmpdir(), 'plumbrule-test-'))
  const config = readConfig({
    DATA_DIR: dataDir,
    LOG_LEVEL: 'fatal',
    ...(options.port ? { PORT: String(options.port) } : {}),
  })
  let offset = Date.parse(START) - Date.now()
  const deps = createDeps(config, () => new Date(Date.now() + offset))
  await migrate(deps.db)
  await seed(deps)
  const app = createApp(deps)
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
      await closeDeps(deps)
      if (!options.dataDir) rmSync(dataDir, { recursive: true, force: true })
    },
  }
}
