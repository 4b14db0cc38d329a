import { useQuery } from '@tanstack/react-query'
import { LongSection } from '../../components/LongSection.tsx'
import { StaffGauge } from '../../components/StaffGauge.tsx'
import { courseQueries } from '../../lib/course-queries.ts'
import { courses, isPublic, type CourseOutline } from '../../lib/course-structure.ts'
import { EnrolPanel } from './EnrolPanel.tsx'
import { LessonList } from './LessonList.tsx'
import './course-view.css'

export function CourseView({ outline }: { outline: CourseOutline }) {
  const query = useQuery(courseQueries.detail(outline.slug))
  const minutes = outline.lessons.reduce((sum, lesson) => sum + (lesson.minutes ?? 0), 0)
  const open = outline.lessons.filter((lesson) => lesson.open).length
  return (
    <>
      <p className="kicker">
        Course {outline.number} of {courses.length}
      </p>
      <h1>{outline.title}</h1>
      <p className="lead">{outline.summary}</p>
      <div className="course-head">
        <LongSection courses={courses} current={outline.number} />
        <aside aria-label="Your place">
          <EnrolPanel query={query} />
        </aside>
      </div>
      <div className="course-view">
        <StaffGauge done={query.data?.lessons.filter(({ done }) => done).length ?? 0} of={outline.lessons.length} />
        <section aria-labelledby="lessons">
          <h2 id="lessons">Lessons</h2>
          <p className="quiet">
            {open === outline.lessons.length
              ? `${open} lessons`
              : `${open} of ${outline.lessons.length} lessons open so far`}
            {minutes > 0 && `, ${minutes} minutes in all`}
          </p>
          <LessonList
            outline={outline}
            course={query.data}
            readable={query.data ? query.data.enrolled || query.data.price.amount === 0 : isPublic(outline)}
          />
        </section>
      </div>
    </>
  )
}
