import fc from 'fast-check'
import { beforeEach, type TestContext } from 'vitest'

declare module 'vitest' {
  interface TaskMeta {
    /** How many properties a test held, and how often they were tried in all. */
    properties?: { held: number; tries: number }
  }
}

let task: TestContext['task']
beforeEach((context) => {
  task = context.task
})

fc.configureGlobal({
  // A short run draws the same cases every time, so that a red one is red for everybody; the long one looks for new ones.
  ...(process.env.DEEP ? {} : { seed: 19_700_101 }),
  reporter: (details) => {
    if (details.failed) throw new Error(fc.defaultReportMessage(details), { cause: details.errorInstance })
    const { held, tries } = task.meta.properties ?? { held: 0, tries: 0 }
    task.meta.properties = { held: held + 1, tries: tries + details.numRuns }
  },
})
