import { Link } from 'react-router-dom'
import type { Course } from '#api/courses/dto/course.schema.ts'
import type { CourseOutline } from '../../lib/course-structure.ts'
import './lesson-list.css'

interface LessonListProps {
  outline: CourseOutline
  /** Absent until the server has answered. */
  course: Course | undefined
  /** Whether a lesson that is there may be read by this reader. */
  readable: boolean
}

export function LessonList({ outline, course, readable }: LessonListProps) {
  return (
    <ol className="lesson-list">
      {outline.lessons.map((lesson) => {
        const done = course?.lessons.some(({ slug, done }) => slug === lesson.slug && done)
        return (
          <li key={lesson.slug} className={lesson.open ? undefined : 'lesson-later'}>
            <span className="lesson-number" aria-hidden="true">
              {lesson.number}
            </span>
            {lesson.open && readable ? (
              <Link to={`/courses/${outline.slug}/${lesson.slug}`}>{lesson.title}</Link>
            ) : (
              <span className="lesson-title">{lesson.title}</span>
            )}
            <span className="lesson-facts">
              {lesson.open ? `${lesson.minutes} minutes` : 'Not yet open'}
              {done && <strong> · ✓ Done</strong>}
            </span>
          </li>
        )
      })}
    </ol>
  )
}
