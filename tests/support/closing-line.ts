import type { Reporter, TestModule } from 'vitest/node'

/** Ends a run with one plain line that any log reader finds: `N passed, N failed, N skipped`. */
export default class ClosingLine implements Reporter {
  onTestRunEnd(modules: readonly TestModule[], unhandled: readonly unknown[]): void {
    const count = { passed: 0, failed: unhandled.length, skipped: 0, pending: 0 }
    for (const module of modules) {
      for (const test of module.children.allTests()) count[test.result().state] += 1
      // A file that does not load has no tests to count, but has failed.
      if (module.state() === 'failed' && count.failed === 0) count.failed += 1
    }
    process.stdout.write(
      `\n${count.passed} passed, ${count.failed} failed, ${count.skipped + count.pending} skipped\n`,
    )
  }
}
