import { Inject } from '@nestjs/common'

export const DATABASE = Symbol('database')

/** `constructor(@InjectDatabase() private readonly database: Database)` */
export const InjectDatabase = () => Inject(DATABASE)
