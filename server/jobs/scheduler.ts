import type { Logger } from 'pino'

export interface Job {
  name: string
  everyMs: number
  run: () => Promise<unknown>
}

/** Runs each job again and again, never twice at once. A failure is logged, and the next turn comes all the same. */
export function startJobs(jobs: readonly Job[], logger: Logger): { stop: () => Promise<void> } {
  const running = new Set<Promise<unknown>>()
  const timers = new Set<NodeJS.Timeout>()
  let stopped = false

  function plan(job: Job, wait: number): void {
    const timer = setTimeout(() => {
      timers.delete(timer)
      const turn = job
        .run()
        .catch((error: unknown) => logger.error({ err: error, job: job.name }, 'a job failed'))
        .finally(() => {
          running.delete(turn)
          if (!stopped) plan(job, job.everyMs)
        })
      running.add(turn)
    }, wait)
    timers.add(timer)
  }

  for (const job of jobs) plan(job, 0)
  return {
    async stop() {
      stopped = true
      for (const timer of timers) clearTimeout(timer)
      await Promise.allSettled(running)
    },
  }
}
