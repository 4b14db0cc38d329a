import type { NestExpressApplication } from '@nestjs/platform-express'
import { DocumentBuilder, SwaggerModule } from '@nestjs/swagger'
import { version } from '../../package.json'
import { calculatorJsonSchemas } from './calculators/calculator-json-schemas.ts'
import { errorSchema } from './common/dto/error.schema.ts'
import { antiForgeryHeader } from './common/guards/access.guard.ts'

/** The contract, made from the routes and their zod schemas: a page at `/api/docs`, the document at `/api/docs-json`. */
export function serveOpenApi(app: NestExpressApplication) {
  const settings = new DocumentBuilder()
    .setTitle('Leatwright')
    .setDescription(
      'Who calls is known from the session cookies. A changing request that is sent with them also needs the header ' +
        `${antiForgeryHeader.name}: ${antiForgeryHeader.value}. Every refusal has one shape: code, message, fields.`,
    )
    .setVersion(version)
    .addGlobalResponse({ status: 'default', description: 'A refusal', standardSchema: errorSchema })
    .build()
  SwaggerModule.setup('api/docs', app, () => {
    const document = SwaggerModule.createDocument(app, settings)
    const { components } = document
    return {
      ...document,
      components: { ...components, schemas: { ...components?.schemas, ...calculatorJsonSchemas() } },
    }
  })
}
