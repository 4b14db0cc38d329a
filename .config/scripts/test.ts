/**
 * Everything that is checked, in one run: lint, format, types, build, unit and API tests, browser tests.
 * `--deep` makes property tests long and adds the slow ones. Ends with one line summed over all runners.
 */
import { spawnSync } from 'node:child_process'
import { mkdirSync, readFileSync, rmSync } from 'node:fs'
import { ensureChromium } from './chromium.ts'

interface Count {
  passed: number
  failed: number
  skipped: number
}

const deep = process.argv.includes('--deep')
const env: NodeJS.ProcessEnv = { ...process.env, ...(deep ? { DEEP: '1' } : {}), FORCE_COLOR: '0', NO_COLOR: '1' }
const reports = '.cache/reports'
rmSync(reports, { recursive: true, force: true })
mkdirSync(reports, { recursive: true })

const run = (name: string, command: string, args: readonly string[]): boolean => {
  console.log(`\n── ${name}`)
  const started = Date.now()
  const { status } = spawnSync(command, args, { stdio: 'inherit', env })
  console.log(`── ${name}: ${status === 0 ? 'passed' : 'FAILED'} in ${((Date.now() - started) / 1000).toFixed(1)} s`)
  return status === 0
}

const npm = (name: string, script: string): Count =>
  run(name, 'npm', ['run', '--silent', script])
    ? { passed: 1, failed: 0, skipped: 0 }
    : { passed: 0, failed: 1, skipped: 0 }

/** A runner's own count; a runner that fell over before it counted is one failure. */
const counted = (ok: boolean, file: string, read: (report: unknown) => Count): Count => {
  let count: Count
  try {
    count = read(JSON.parse(readFileSync(`${reports}/${file}`, 'utf8')))
  } catch {
    return { passed: 0, failed: 1, skipped: 0 }
  }
  return ok || count.failed > 0 ? count : { ...count, failed: 1 }
}

const vitest = (): Count => {
  const ok = run('unit and API tests', 'npx', [
    ...['vitest', 'run', '-c', '.config/vitest.config.ts', '--reporter=default', '--reporter=json'],
    `--outputFile.json=${reports}/vitest.json`,
    // Fails the run where a calculator has too few checks from outside the project.
    '--reporter=./calc/testing/outside-checks-reporter.ts',
  ])
  return counted(ok, 'vitest.json', (report) => {
    const r = report as {
      numPassedTests: number
      numFailedTests: number
      numPendingTests: number
      numTodoTests: number
    }
    return { passed: r.numPassedTests, failed: r.numFailedTests, skipped: r.numPendingTests + r.numTodoTests }
  })
}

const playwright = (): Count => {
  ensureChromium()
  env.PLAYWRIGHT_JSON_OUTPUT_NAME = `${reports}/playwright.json`
  const ok = run('browser tests', 'npx', ['playwright', 'test', '--reporter=list,json'])
  return counted(ok, 'playwright.json', (report) => {
    const { stats } = report as { stats: { expected: number; unexpected: number; flaky: number; skipped: number } }
    return { passed: stats.expected + stats.flaky, failed: stats.unexpected, skipped: stats.skipped }
  })
}

const counts: Count[] = [
  npm('lint', 'lint'),
  npm('format', 'format:check'),
  npm('types', 'types'),
  npm('build', 'build'),
]
const built = counts[3]!.failed === 0
counts.push(vitest())
if (built) counts.push(playwright())

const total = counts.reduce((a, b) => ({
  passed: a.passed + b.passed,
  failed: a.failed + b.failed,
  skipped: a.skipped + b.skipped,
}))
console.log(`\n${total.passed} passed, ${total.failed} failed, ${total.skipped} skipped`)
process.exit(total.failed === 0 ? 0 : 1)
