import type { MDXComponents } from 'mdx/types'
import { lazy, Suspense, useContext, type ComponentProps, type ComponentType } from 'react'
import { Caution } from '../components/Caution.tsx'
import { Drawing } from '../features/lessons/Drawing.tsx'
import { FromTheTrade } from '../features/lessons/FromTheTrade.tsx'
import { Gloss } from '../features/lessons/Gloss.tsx'
import { Heading } from '../features/lessons/Heading.tsx'
import { SiteTask } from '../features/lessons/SiteTask.tsx'
import { Source } from '../features/lessons/Source.tsx'
import { WideTable } from '../features/lessons/WideTable.tsx'
import { CheckYourself } from '../features/questions/CheckYourself.tsx'
import { Row } from './attributes.ts'
import { LessonContext } from './lesson-context.ts'

/** What calculates comes after the lesson's text, with the library behind it. */
function later<P extends object>(words: string, load: () => Promise<{ default: ComponentType<P> }>) {
  const Loaded = lazy<ComponentType<P>>(load)
  return function Later(props: P) {
    return (
      <Suspense fallback={<p className="on-its-way">{words}</p>}>
        <Loaded {...props} />
      </Suspense>
    )
  }
}

interface CheckYourselfProps {
  /** Unique in its lesson. */
  name: string
  /** The ids of its questions, apart by spaces; the server draws them. */
  questions: string
}

function LessonQuestions({ name, questions }: CheckYourselfProps) {
  const place = useContext(LessonContext)
  const count = questions.trim().split(/\s+/).length
  return place ? (
    <CheckYourself {...place} block={name} count={count} />
  ) : (
    <p className="on-its-way">{count} questions stand here.</p>
  )
}

/** Everything that a lesson may use, shipped or written on the teaching desk. Attributes are literals only. */
export const components = {
  h2: (props: ComponentProps<'h2'>) => <Heading as="h2" {...props} />,
  h3: (props: ComponentProps<'h3'>) => <Heading as="h3" {...props} />,
  table: WideTable,
  Calculator: later('The calculator is on its way.', () => import('./LiveCalculator.tsx')),
  Row,
  WorkedExample: later('The worked example is on its way.', () => import('./WorkedExample.tsx')),
  FadedExample: later('The example with blanks is on its way.', () => import('./FadedExample.tsx')),
  Plot: later('The plot is on its way.', () => import('./LessonPlot.tsx')),
  Drawing,
  Caution,
  FromTheTrade,
  Source,
  Gloss,
  CheckYourself: LessonQuestions,
  SiteTask,
} satisfies MDXComponents
