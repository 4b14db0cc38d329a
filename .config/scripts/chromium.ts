import { execFileSync, spawnSync } from 'node:child_process'
import { existsSync } from 'node:fs'

/** Debian's Chromium: the one browser the tests and the README's picture are made with. */
export const chromiumPath = process.env.CHROMIUM_PATH ?? '/usr/bin/chromium'

export const chromiumFlags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
]

/** Finds Chromium or, as root on Debian, installs it; otherwise says what to do and ends the process. */
export const ensureChromium = (): void => {
  if (existsSync(chromiumPath)) return
  const isRoot = process.getuid?.() === 0
  if (isRoot && spawnSync('apt-get', ['--version']).status === 0) {
    console.log('Chromium is not on this machine: installing Debian’s package.')
    spawnSync('apt-get', ['update', '-qq'], { stdio: 'inherit' })
    execFileSync('apt-get', ['install', '-y', '-qq', 'chromium'], {
      stdio: ['ignore', 'ignore', 'inherit'],
      env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    })
    if (existsSync(chromiumPath)) return
  }
  console.error(
    `The browser tests need Chromium at ${chromiumPath}. As root on Debian run “apt-get install -y chromium”, or set CHROMIUM_PATH.`,
  )
  process.exit(1)
}
