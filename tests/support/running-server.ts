import { spawn, type ChildProcess } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { freePorts } from './free-ports.ts'

const root = fileURLToPath(new URL('../..', import.meta.url))

async function untilHealthy(url: string, child: ChildProcess, output: () => string): Promise<void> {
  const deadline = Date.now() + 30_000
  while (Date.now() < deadline) {
    if (child.exitCode !== null) throw new Error(`the server stopped with ${child.exitCode}:\n${output()}`)
    const ok = await fetch(`${url}/healthz`).then(
      (reply) => reply.ok,
      () => false,
    )
    if (ok) return
    await new Promise((resolve) => setTimeout(resolve, 100))
  }
  throw new Error(`the server did not answer in 30 s:\n${output()}`)
}

/** The built application in demo mode, as `npm start` runs it, on a folder of its own. */
export class RunningServer {
  readonly dataDir = mkdtempSync(join(tmpdir(), 'plumbrule-'))
  url = ''
  mailboxUrl = ''
  #port = 0
  #child: ChildProcess | undefined
  #output = ''

  async start(): Promise<void> {
    this.#port ||= await freePorts()
    this.url = `http://localhost:${this.#port}`
    this.mailboxUrl = `http://localhost:${this.#port + 2}`
    // Vitest's own mode is none of the server's.
    const env = { ...process.env, NODE_ENV: '' }
    const child = spawn(process.execPath, ['server/dist/main.js'], {
      cwd: root,
      env: { ...env, PORT: String(this.#port), DATA_DIR: this.dataDir },
      stdio: ['ignore', 'pipe', 'pipe'],
    })
    this.#child = child
    for (const stream of [child.stdout, child.stderr]) {
      stream.on('data', (chunk: Buffer) => {
        this.#output += chunk.toString()
      })
    }
    await untilHealthy(this.url, child, () => this.#output)
  }

  /** What it has printed so far. */
  get output(): string {
    return this.#output
  }

  /** Ends it with a signal (SIGKILL: as a pulled plug) and waits until it is gone. */
  async end(signal: NodeJS.Signals): Promise<void> {
    const child = this.#child
    if (!child || child.exitCode !== null || child.signalCode !== null) return
    const gone = new Promise((resolve) => child.once('exit', resolve))
    child.kill(signal)
    await gone
  }

  async stop(): Promise<void> {
    await this.end('SIGTERM')
    rmSync(this.dataDir, { recursive: true, force: true })
  }
}
