import { createHash } from 'node:crypto'
import { mkdirSync, realpathSync } from 'node:fs'
import { createServer, type Server } from 'node:net'

/**
 * Two processes on one embedded database lose rows without a word, so only one may open the folder. The lock is a
 * socket without a file, named from the folder: the kernel frees it the moment its process ends, however it ends.
 * Linux knows such sockets as abstract sockets, Windows as named pipes.
 */
export async function lockFolder(folder: string): Promise<Server> {
  mkdirSync(folder, { recursive: true })
  const name = `leatwright-${createHash('sha256').update(realpathSync(folder)).digest('hex')}`
  const lock = createServer((connection) => connection.destroy())
  await new Promise<void>((resolve, reject) => {
    lock.once('error', (error: NodeJS.ErrnoException) => {
      const held = error.code === 'EADDRINUSE' || error.code === 'EACCES'
      reject(held ? new FolderInUseError(folder) : error)
    })
    lock.listen(process.platform === 'win32' ? `\\\\.\\pipe\\${name}` : `\0${name}`, resolve)
  })
  return lock.unref()
}

export class FolderInUseError extends Error {
  constructor(folder: string) {
    super(
      `Another Leatwright server has the data folder ${folder} open, and two would lose work. ` +
        'Stop the other one, or give this one a DATA_DIR of its own.',
    )
    this.name = 'FolderInUseError'
  }
}
