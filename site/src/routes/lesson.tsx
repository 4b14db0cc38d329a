import { useLoaderData, type LoaderFunctionArgs } from 'react-router-dom'
import { Page } from '../components/Page.tsx'
import { LessonPage } from '../features/lessons/LessonPage.tsx'
import { loadLesson } from '../features/lessons/lesson-files.ts'
import { NoLesson } from '../features/lessons/NoLesson.tsx'
import { useLessonText } from '../features/lessons/use-lesson-text.ts'
import { findCourse, isPublic } from '../lib/course-structure.ts'
import { components } from '../mdx/components.tsx'
import { LessonContext } from '../mdx/lesson-context.ts'

/** A free lesson's text comes with the page, also when that is rendered at build; a paid one's is asked for by the reader's browser. */
export async function loader({ params }: LoaderFunctionArgs) {
  const course = findCourse(params.course)
  const lesson = course?.lessons.find(({ slug }) => slug === params.lesson)
  if (!course || !lesson) throw new Response('There is no lesson at this address.', { status: 404 })
  const withPage =
    lesson.open && isPublic(course) ? await loadLesson(course.slug, lesson.slug).catch(() => undefined) : undefined
  return { course, lesson, withPage }
}

export function Component() {
  const { course, lesson, withPage } = useLoaderData<typeof loader>()
  return (
    <>
      <Page title={lesson.title} description={`${course.title}, lesson ${lesson.number}: ${lesson.title}.`} />
      {lesson.open ? (
        <OpenLesson key={lesson.slug} course={course} lesson={lesson} withPage={withPage} />
      ) : (
        <LessonPage course={course} lesson={lesson} contents={undefined}>
          <p className="lead">This lesson is not written yet. It opens here when it is.</p>
        </LessonPage>
      )}
    </>
  )
}

function OpenLesson({ course, lesson, withPage }: Awaited<ReturnType<typeof loader>>) {
  const { text, error, retry } = useLessonText(course.slug, lesson.slug, withPage)
  const Text = text?.default
  return (
    <LessonPage course={course} lesson={lesson} contents={text?.frontmatter.contents}>
      {Text ? (
        <LessonContext value={{ course: course.slug, lesson: lesson.slug }}>
          <div className="reading lesson-text">
            <Text components={components} />
          </div>
        </LessonContext>
      ) : (
        <NoLesson course={course} lesson={lesson} error={error} retry={retry} />
      )}
    </LessonPage>
  )
}
