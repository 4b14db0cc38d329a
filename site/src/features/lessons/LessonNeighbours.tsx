import { Link } from 'react-router-dom'
import type { CourseOutline, LessonOutline } from '../../lib/course-structure.ts'

interface LessonNeighboursProps {
  course: CourseOutline
  lesson: LessonOutline
}

/** The lessons before and after, in the order of the water. */
export function LessonNeighbours({ course, lesson }: LessonNeighboursProps) {
  const before = course.lessons[lesson.number - 2]
  const after = course.lessons[lesson.number]
  return (
    <nav className="lesson-neighbours" aria-label="Lessons before and after">
      {before && <Neighbour course={course.slug} lesson={before} which="The lesson before" />}
      {after ? (
        <Neighbour course={course.slug} lesson={after} which="The next lesson" />
      ) : (
        <p>
          <span>The last lesson of this course</span>
          <Link to={`/courses/${course.slug}`}>Back to {course.title}</Link>
        </p>
      )}
    </nav>
  )
}

function Neighbour({ course, lesson, which }: { course: string; lesson: LessonOutline; which: string }) {
  return (
    <p>
      <span>{which}</span>
      {lesson.open ? (
        <Link to={`/courses/${course}/${lesson.slug}`}>
          {lesson.number} · {lesson.title}
        </Link>
      ) : (
        <span className="quiet">
          {lesson.number} · {lesson.title} (not yet open)
        </span>
      )}
    </p>
  )
}
