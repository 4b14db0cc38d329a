import type { Reporter, TestCase, TestModule } from 'vitest/node'
import { calculators } from '../calculators.ts'
import { countChecks, tableOfChecks, wanted } from './count-checks.ts'

const outermostSuite = (test: TestCase): string | undefined => {
  let suite: string | undefined
  for (let { parent } = test; parent.type === 'suite'; parent = parent.parent) suite = parent.name
  return suite
}

/** Prints, after a run of the library's tests, what they checked each calculator against; fails the run where that is too little. */
export default class OutsideChecksReporter implements Reporter {
  onTestRunEnd(modules: readonly TestModule[]) {
    const ofLibrary = modules.filter(({ project }) => project.name === 'calc')
    const passed = ofLibrary.flatMap(({ relativeModuleId: file, children }) =>
      [...children.allTests('passed')].map((test) => ({ ...test.meta(), file, suite: outermostSuite(test) })),
    )
    const counted = countChecks(Object.keys(calculators), passed)
    console.log(`\nChecks that ran and passed\n${tableOfChecks(counted)}`)
    if (counted.short.length === 0) return
    console.error(`\nFewer than ${wanted} from outside the project: ${counted.short.join(', ')}`)
    process.exitCode = 1
  }
}
