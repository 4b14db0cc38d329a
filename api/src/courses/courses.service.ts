import { Injectable } from '@nestjs/common'
import { and, eq } from 'drizzle-orm'
import { type CourseEntry, courseList } from '#content/course-list.ts'
import type { School } from '#content/school.ts'
import { Refusal } from '../common/refusal.ts'
import type { Database } from '../database/connection.ts'
import { InjectDatabase } from '../database/inject-database.ts'
import { attempts } from '../database/schema/attempts.ts'
import { courses, enrolments } from '../database/schema/courses.ts'
import { InjectSchool } from '../school/school.module.ts'
import type { User } from '../users/dto/user.schema.ts'
import type { Course } from './dto/course.schema.ts'

/** What one person has of the school. */
interface Standing {
  enrolled: ReadonlySet<string>
  done: ReadonlySet<string>
}

@Injectable()
export class CoursesService {
  constructor(
    @InjectDatabase() private readonly database: Database,
    @InjectSchool() private readonly school: School,
  ) {}

  async list(user: User | undefined): Promise<Course[]> {
    const [prices, standing] = await Promise.all([this.database.select().from(courses), this.standing(user)])
    return courseList.flatMap((entry, i) => {
      const price = prices.find(({ slug, open }) => slug === entry.slug && open)
      return price
        ? [this.course(entry, i + 1, { amount: price.priceAmount, currency: price.priceCurrency }, standing)]
        : []
    })
  }

  async one(slug: string, user: User | undefined): Promise<Course> {
    const course = (await this.list(user)).find((one) => one.slug === slug)
    if (!course) throw new Refusal('not-found', 'There is no course of this name.')
    return course
  }

  /** A free course is joined at once; again is no harm. A paid one is refused until it can be bought. */
  async enrol(slug: string, user: User): Promise<Course> {
    const course = await this.one(slug, user)
    if (course.enrolled) return course
    if (course.price.amount > 0)
      throw new Refusal('payment-needed', `“${course.title}” has a price: a place has to be paid for first.`)
    await this.database.insert(enrolments).values({ userId: user.id, courseSlug: slug }).onConflictDoNothing()
    return { ...course, enrolled: true }
  }

  private async standing(user: User | undefined): Promise<Standing> {
    if (!user) return { enrolled: new Set(), done: new Set() }
    const [places, passed] = await Promise.all([
      this.database.select({ slug: enrolments.courseSlug }).from(enrolments).where(eq(enrolments.userId, user.id)),
      this.database
        .selectDistinct({ lesson: attempts.lesson, block: attempts.block })
        .from(attempts)
        .where(and(eq(attempts.userId, user.id), eq(attempts.passed, true))),
    ])
    const has = new Set(passed.map(({ lesson, block }) => `${lesson} ${block}`))
    const done = [...this.school.values()].filter(
      ({ slug, blocks }) => blocks.length > 0 && blocks.every(({ name }) => has.has(`${slug} ${name}`)),
    )
    return { enrolled: new Set(places.map(({ slug }) => slug)), done: new Set(done.map(({ slug }) => slug)) }
  }

  private course(entry: CourseEntry, number: number, price: Course['price'], { enrolled, done }: Standing): Course {
    const { slug, title, summary, station, lessons } = entry
    return {
      ...{ slug, number, title, summary, station, price },
      enrolled: enrolled.has(slug),
      lessons: lessons.map((lesson, i) => {
        const open = this.school.get(lesson.slug)
        return {
          slug: lesson.slug,
          number: i + 1,
          title: open?.frontmatter.title ?? lesson.title,
          minutes: open?.frontmatter.minutes,
          open: open !== undefined,
          done: done.has(lesson.slug),
        }
      }),
    }
  }
}
