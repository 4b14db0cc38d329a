/** Every figure in one run; one that is missed does not hide the others. */
import { spawnSync } from 'node:child_process'

const scripts = ['calc/bench/run.ts', 'api/bench/run.ts', 'site/scripts/weights.ts']

const failed = scripts.filter((script) => {
  console.log(`\n── ${script}`)
  return spawnSync('npx', ['tsx', script], { stdio: 'inherit' }).status !== 0
})
if (failed.length > 0) console.error(`\nFailed: ${failed.join(', ')}`)
process.exit(failed.length === 0 ? 0 : 1)
