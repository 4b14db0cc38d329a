import { Button } from '@radix-ui/themes'
import { Link } from 'react-router-dom'
import { LongSection } from '../components/LongSection.tsx'
import { Page } from '../components/Page.tsx'
import { CourseLegend } from '../features/catalogue/CourseLegend.tsx'
import { courses } from '../lib/course-structure.ts'

export function Component() {
  return (
    <div className="page">
      <Page
        title="Small hydro, sized and proved"
        description="Five courses for people who build small hydro, from the stream to the load. Every sum is live, shows its working, and takes your own numbers."
      />
      <h1>
        Size it on paper. <br />
        Prove it on your own stream.
      </h1>
      <p className="lead">
        Five courses for people who build small hydro, laid out the way the water runs. Every sum in them is live, shows
        its working, and takes your numbers.
      </p>
      <div className="actions">
        <Button asChild size="3">
          <Link to={`/courses/${courses[0]!.slug}`}>Start with the stream, free</Link>
        </Button>
        <Button asChild size="3" variant="outline">
          <Link to="/calculators">Open a calculator</Link>
        </Button>
      </div>
      <LongSection courses={courses} />
      <CourseLegend courses={courses} />
    </div>
  )
}
