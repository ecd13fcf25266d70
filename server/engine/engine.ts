import { Piscina } from 'piscina'
import { Refusal } from '../../shared/units/refusal.ts'
import type { EngineTasks, TaskName } from './engine-tasks.ts'

/** The engine at work beside the requests: a schedule of hundreds holds up nobody. Throws `Refusal` as it does. */
export interface Engine {
  run: <Name extends TaskName>(
    name: Name,
    input: Parameters<EngineTasks[Name]>[0],
  ) => Promise<ReturnType<EngineTasks[Name]>>
  close: () => Promise<void>
}

/** An error loses its class on the way between threads: a refusal travels as what it says. */
export type Outcome = { answer: unknown } | { refused: Refusal['issues'] }

export function createEngine(workerFile: string): Engine {
  const pool = new Piscina<{ name: TaskName; input: unknown }, Outcome>({
    filename: workerFile,
    execArgv: workerFile.endsWith('.ts') ? ['--import', 'tsx'] : [],
    minThreads: 1,
    maxThreads: 2,
    idleTimeout: 10 * 60_000,
  })
  return {
    async run(name, input) {
      const outcome = await pool.run({ name, input })
      if ('refused' in outcome) throw new Refusal(outcome.refused)
      return outcome.answer as never
    },
    close: () => pool.destroy(),
  }
}
