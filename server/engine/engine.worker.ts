import { Refusal } from '../../shared/units/refusal.ts'
import { engineTasks, type TaskName } from './engine-tasks.ts'
import type { Outcome } from './engine.ts'

/** Piscina's task: one of the engine's, by name. */
export default function work({ name, input }: { name: TaskName; input: unknown }): Outcome {
  try {
    const task = engineTasks[name] as (input: unknown) => unknown
    return { answer: task(input) }
  } catch (error) {
    if (error instanceof Refusal) return { refused: error.issues }
    throw error
  }
}
