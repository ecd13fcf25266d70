import { createServer } from 'node:http'
import { fileURLToPath } from 'node:url'
import { DEMO_PASSWORD, DEMO_PEOPLE } from '../seeds/demo/people.ts'
import { createApp } from './app.ts'
import { ConfigFault, readConfig, type Config } from './config.ts'
import { closeDeps, createDeps } from './create-deps.ts'
import { migrate } from './db/migrate.ts'
import type { Deps } from './deps.ts'
import { startFakes } from './fakes.ts'
import { startJobs } from './jobs/scheduler.ts'
import { jobsOf } from './jobs/jobs.ts'
import { listen } from './listen.ts'
import { seed } from './seed.ts'

const PAGES = fileURLToPath(new URL('../../web/dist', import.meta.url))

async function start(): Promise<void> {
  const config = readConfig()
  const deps = createDeps(config)
  await migrate(deps.db)
  await seed(deps)
  const fakes = config.mode === 'demo' ? await startFakes(config, deps.logger) : undefined
  const server = await listen(createServer(createApp(deps, PAGES)), config.port, config.host)
  const jobs = startJobs(jobsOf(deps), deps.logger)
  welcome(config)

  let ending = false
  async function end(): Promise<void> {
    if (ending) return
    ending = true
    await server.stop()
    await jobs.stop()
    await fakes?.stop()
    await closeDeps(deps)
  }
  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    process.on(signal, () => void end().catch((error: unknown) => giveUp(deps, error)))
  }
}

function welcome({ mode, publicUrl, mail, stripe }: Config): void {
  const lines = [`Plumbrule is at ${publicUrl}`]
  if (mode === 'demo') {
    lines.push(
      `  mailbox    ${mail.fakeUrl}`,
      `  card page  ${stripe.fakeUrl}`,
      `  demo accounts, all with the password ${DEMO_PASSWORD}:`,
      ...DEMO_PEOPLE.map(({ email, name, role }) => `    ${email.padEnd(32)} ${role} (${name})`),
    )
  }
  process.stdout.write(`${lines.join('\n')}\n`)
}

function giveUp(deps: Deps, error: unknown): void {
  deps.logger.fatal({ err: error }, 'could not end in order')
  process.exit(1)
}

start().catch((error: unknown) => {
  const inUse = error instanceof Error && 'code' in error && error.code === 'EADDRINUSE'
  const words = inUse ? 'The port is taken: set PORT to another.' : undefined
  const text = error instanceof ConfigFault ? error.message : (words ?? (error as Error).stack)
  process.stderr.write(`${text}\n`)
  process.exit(1)
})
