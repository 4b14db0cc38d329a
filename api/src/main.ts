import 'reflect-metadata'
import { AppModule } from './app.module.ts'
import { ConfigurationError, readEnvironment } from './config/environment.ts'
import { createApp } from './create-app.ts'
import { openDatabase } from './database/connection.ts'
import { FolderInUseError } from './database/folder-lock.ts'

async function start() {
  const environment = readEnvironment(process.env)
  const connection = await openDatabase(environment)
  const app = await createApp(AppModule.forRoot(environment, connection))

  let isStopping = false
  const stop = () => {
    if (isStopping) return
    isStopping = true
    app.close().then(
      () => process.exit(0),
      (error: unknown) => fail(error),
    )
  }
  process.on('SIGTERM', stop)
  process.on('SIGINT', stop)
  // The start command that this process belongs to is gone.
  process.on('disconnect', stop)

  await app.listen(environment.PORT)
  if (process.send) process.send('listening')
  else console.log(`Leatwright takes requests at ${environment.PUBLIC_URL}`)
}

function fail(error: unknown): never {
  const isPlain = error instanceof ConfigurationError || error instanceof FolderInUseError
  console.error(isPlain ? error.message : error)
  process.exit(1)
}

start().catch(fail)
