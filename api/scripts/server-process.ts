import { type ChildProcess, spawn } from 'node:child_process'
import path from 'node:path'
import { projectRoot } from '../src/project-root.ts'

export const builtServer = path.join(projectRoot, 'dist/api/main.js')

/** Runs the built server; `whenListening` is called when it takes requests. It stops by itself when this process is gone. */
export function startServer(environment: NodeJS.ProcessEnv, whenListening: () => void): ChildProcess {
  const server = spawn(process.execPath, ['--enable-source-maps', builtServer], {
    cwd: projectRoot,
    env: environment,
    stdio: ['inherit', 'inherit', 'inherit', 'ipc'],
  })
  server.once('message', whenListening)
  return server
}

export const ended = (child: ChildProcess) =>
  new Promise<number>((resolve) => child.once('exit', (code, signal) => resolve(code ?? (signal ? 1 : 0))))
