import { type DynamicModule, type LogLevel, RequestMethod } from '@nestjs/common'
import { NestFactory } from '@nestjs/core'
import type { NestExpressApplication } from '@nestjs/platform-express'
import cookieParser from 'cookie-parser'
import { json } from 'express'
import helmet from 'helmet'
import { serveOpenApi } from './open-api.ts'
import { SITE_FOLDER } from './site-files/lesson-files.controller.ts'
import { siteFiles } from './site-files/site-files.ts'

/** The application of `AppModule`, ready to listen; the server and the tests make it alike. */
export async function createApp(
  module: DynamicModule,
  logger: LogLevel[] = ['warn', 'error', 'fatal'],
): Promise<NestExpressApplication> {
  const app = await NestFactory.create<NestExpressApplication>(module, {
    // Only JSON is read: no form of another site can send that.
    bodyParser: false,
    rawBody: true,
    logger,
    abortOnError: false,
  })
  app.set('trust proxy', 'loopback')
  app.disable('x-powered-by')
  app.use(helmet({ contentSecurityPolicy: { useDefaults: false, directives: contentPolicy }, hsts: false }))
  app.use(cookieParser())
  // Before the parser of all other routes: a record of flows is long, and so are many calculations at once.
  app.use('/api/calculators', json({ limit: '4mb' }))
  app.useBodyParser('json', { limit: '256kb' })
  app.use(siteFiles(app.get<string>(SITE_FOLDER)))
  app.setGlobalPrefix('api', { exclude: [{ path: 'lessons/:course/:file', method: RequestMethod.GET }] })
  serveOpenApi(app)
  await app.init()
  return app
}

/** Everything comes from this server. Style elements may stand in the page (the component library makes some); scripts never. */
const contentPolicy = {
  defaultSrc: ["'self'"],
  scriptSrc: ["'self'"],
  styleSrc: ["'self'", "'unsafe-inline'"],
  imgSrc: ["'self'", 'data:'],
  connectSrc: ["'self'"],
  fontSrc: ["'self'"],
  objectSrc: ["'none'"],
  baseUri: ["'self'"],
  formAction: ["'self'"],
  frameAncestors: ["'none'"],
}
