import { Injectable } from '@nestjs/common'
import type { School } from '#content/school.ts'
import { Refusal } from '../common/refusal.ts'
import { LessonAccessService } from '../lesson-access/lesson-access.service.ts'
import { InjectSchool } from '../school/school.module.ts'
import type { User } from '../users/dto/user.schema.ts'
import type { Lesson } from './dto/lesson.schema.ts'

@Injectable()
export class LessonsService {
  constructor(
    @InjectSchool() private readonly school: School,
    private readonly access: LessonAccessService,
  ) {}

  async one(slug: string, user: User | undefined): Promise<Lesson> {
    const lesson = this.school.get(slug)
    if (!lesson) throw new Refusal('not-found', 'There is no lesson of this name, or it is not open yet.')
    await this.access.check(lesson.course, user)
    const { course, number, frontmatter, blocks } = lesson
    return {
      slug,
      course,
      number,
      title: frontmatter.title,
      minutes: frontmatter.minutes,
      blocks: blocks.map(({ name }) => name),
    }
  }
}
