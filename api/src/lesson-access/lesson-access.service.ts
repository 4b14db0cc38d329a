import { Injectable } from '@nestjs/common'
import { and, eq, sql } from 'drizzle-orm'
import { courseList } from '#content/course-list.ts'
import { notSignedIn, Refusal } from '../common/refusal.ts'
import type { Database } from '../database/connection.ts'
import { InjectDatabase } from '../database/inject-database.ts'
import { courses, enrolments } from '../database/schema/courses.ts'
import type { User } from '../users/dto/user.schema.ts'

/** The one rule of who may have a course's lessons: a free one everybody, a paid one who is enrolled. */
@Injectable()
export class LessonAccessService {
  constructor(@InjectDatabase() private readonly database: Database) {}

  /** Refuses with `not-found`, `not-signed-in` or `not-enrolled`; says whether the course is free. */
  async check(courseSlug: string, user: User | undefined): Promise<{ free: boolean }> {
    const isEnrolled = user
      ? sql<boolean>`exists (${this.database
          .select({ one: sql`1` })
          .from(enrolments)
          .where(and(eq(enrolments.courseSlug, courseSlug), eq(enrolments.userId, user.id)))})`
      : sql<boolean>`false`
    const [course] = await this.database
      .select({ priceAmount: courses.priceAmount, isEnrolled })
      .from(courses)
      .where(eq(courses.slug, courseSlug))
    if (!course) throw new Refusal('not-found', 'There is no course of this name.')
    if (course.priceAmount === 0) return { free: true }
    if (!user) throw notSignedIn()
    if (!course.isEnrolled) {
      const title = courseList.find(({ slug }) => slug === courseSlug)?.title ?? courseSlug
      throw new Refusal('not-enrolled', `This lesson belongs to the course “${title}”: enrol in it to go on.`)
    }
    return { free: false }
  }
}
