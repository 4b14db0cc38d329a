import { Injectable, type OnApplicationBootstrap } from '@nestjs/common'
import { ConfigService } from '@nestjs/config'
import { courseList } from '#content/course-list.ts'
import type { School } from '#content/school.ts'
import type { Environment } from '../../config/environment.ts'
import type { Database, Transaction } from '../connection.ts'
import { InjectDatabase } from '../inject-database.ts'
import { courses } from '../schema/courses.ts'
import { users } from '../schema/users.ts'
import { InjectSchool } from '../../school/school.module.ts'
import { seedDemo } from './demo.ts'

@Injectable()
export class SeedService implements OnApplicationBootstrap {
  constructor(
    @InjectDatabase() private readonly database: Database,
    @InjectSchool() private readonly school: School,
    private readonly config: ConfigService<Environment, true>,
  ) {}

  async onApplicationBootstrap() {
    await this.database.transaction(async (transaction) => {
      await this.addMissingCourses(transaction)
      const isEmpty = (await transaction.$count(users)) === 0
      if (isEmpty && this.config.get('DEMO', { infer: true })) await seedDemo(transaction, this.school)
    })
  }

  /** A first price is written once; after that the database rules it. */
  private async addMissingCourses(transaction: Transaction) {
    await transaction
      .insert(courses)
      .values(
        courseList.map(({ slug, firstPrice }) => ({
          slug,
          priceAmount: firstPrice.amount,
          priceCurrency: firstPrice.currency,
        })),
      )
      .onConflictDoNothing()
  }
}
