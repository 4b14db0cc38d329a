import { useParams } from 'react-router-dom'
import { Page } from '../components/Page.tsx'
import { NotFound } from '../components/RouteError.tsx'
import { CourseView } from '../features/catalogue/CourseView.tsx'
import { findCourse } from '../lib/course-structure.ts'

export function Component() {
  const outline = findCourse(useParams().course)
  if (!outline) return <NotFound>There is no course at this address.</NotFound>
  return (
    <div className="page">
      <Page title={outline.title} description={`${outline.title}: ${outline.summary}`} />
      <CourseView outline={outline} />
    </div>
  )
}
