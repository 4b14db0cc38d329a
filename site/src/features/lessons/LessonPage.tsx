import { useQuery } from '@tanstack/react-query'
import type { ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { StaffGauge } from '../../components/StaffGauge.tsx'
import { courseQueries } from '../../lib/course-queries.ts'
import type { CourseOutline, LessonOutline } from '../../lib/course-structure.ts'
import { hazardWords } from '../../lib/hazard-words.ts'
import type { ContentsEntry } from '../../mdx/remark-contents.ts'
import { LessonNeighbours } from './LessonNeighbours.tsx'
import './lesson.css'

interface LessonPageProps {
  course: CourseOutline
  lesson: LessonOutline
  /** Absent until the lesson's text is there. */
  contents: readonly ContentsEntry[] | undefined
  children: ReactNode
}

const listed = new Intl.ListFormat('en-GB')

/** What stands around a lesson's text. */
export function LessonPage({ course, lesson, contents, children }: LessonPageProps) {
  const progress = useQuery(courseQueries.detail(course.slug)).data?.lessons ?? []
  const isDone = progress.some(({ slug, done }) => slug === lesson.slug && done)
  return (
    <div className="page lesson">
      <div className="lesson-progress">
        <StaffGauge done={progress.filter(({ done }) => done).length} of={course.lessons.length} />
      </div>
      <article className="lesson-article">
        <header className="lesson-head">
          <p className="kicker">
            <Link to={`/courses/${course.slug}`}>
              {course.number} · {course.title}
            </Link>{' '}
            — lesson {lesson.number}
            {lesson.minutes !== undefined && ` · ${lesson.minutes} minutes`}
            {isDone && <strong className="lesson-done"> · ✓ Done</strong>}
          </p>
          <h1>{lesson.title}</h1>
          {lesson.hazards.length > 0 && (
            <p className="lesson-hazards">
              <strong>Touches on danger:</strong> {listed.format(lesson.hazards.map((hazard) => hazardWords[hazard]))}.
            </p>
          )}
        </header>
        {contents && contents.length > 0 && <LessonContents contents={contents} />}
        {children}
        <LessonNeighbours course={course} lesson={lesson} />
      </article>
    </div>
  )
}

/** Beside the first paragraphs where there is room; folded up above them where there is none. */
function LessonContents({ contents }: { contents: readonly ContentsEntry[] }) {
  return (
    <nav className="lesson-contents" aria-label="In this lesson">
      <div className="contents-wide">
        <p>In this lesson</p>
        <ContentsList contents={contents} />
      </div>
      <details className="contents-narrow">
        <summary>In this lesson</summary>
        <ContentsList contents={contents} />
      </details>
    </nav>
  )
}

function ContentsList({ contents }: { contents: readonly ContentsEntry[] }) {
  return (
    <ol>
      {contents.map(({ id, title }) => (
        <li key={id}>
          <a href={`#${id}`}>{title}</a>
        </li>
      ))}
    </ol>
  )
}
