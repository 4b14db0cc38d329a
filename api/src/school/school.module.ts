import { Global, Inject, Module } from '@nestjs/common'
import { readSchool, type School } from '#content/school.ts'

const SCHOOL = 'school'

/** `@InjectSchool() school: School`: every lesson that is open, with its blocks and its bank. */
export const InjectSchool = () => Inject(SCHOOL)

const sources = import.meta.glob<string>(['../../../content/*/*.mdx', '../../../content/*/*.questions.yaml'], {
  query: '?raw',
  import: 'default',
  eager: true,
})

/** The lessons and banks that were built into this server; read once, so that a fault in one stops the start. */
@Global()
@Module({
  providers: [{ provide: SCHOOL, useFactory: (): School => readSchool(sources) }],
  exports: [SCHOOL],
})
export class SchoolModule {}
