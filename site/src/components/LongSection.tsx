import { Link } from 'react-router-dom'
import type { CourseOutline } from '../lib/course-structure.ts'
import { sectionId, SectionDefinitions } from './SectionDrawing.tsx'
import { courseMarks, courseSlices, courseStations, stationLabels } from './section-stations.ts'
import './long-section.css'

interface LongSectionProps {
  courses: readonly Pick<CourseOutline, 'slug' | 'number' | 'title'>[]
  /** The number of the course whose page this is: the drawing is then smaller, and a narrow screen has its slice alone. */
  current?: number
}

/** The scheme from stream to load, and the way to each course. On a narrow screen it is told in slices: see SectionSlice. */
export function LongSection({ courses, current }: LongSectionProps) {
  const small = current !== undefined
  return (
    <div className={small ? 'long-section small' : 'long-section'}>
      <SectionDefinitions />
      <svg className="section-whole" viewBox="0 0 1160 428" role="group" aria-label="The scheme in long section">
        <use href={`#${sectionId}`} />
        {small ? (
          <text
            className="section-label"
            textAnchor={courseStations[current]!.anchor}
            {...place(courseStations[current]!)}
          >
            {courseStations[current]!.text}
          </text>
        ) : (
          <Words />
        )}
        {courses.map((course) => (
          <CourseMark key={course.slug} course={course} current={course.number === current} small={small} />
        ))}
      </svg>
      {small && <SectionSlice course={current} />}
    </div>
  )
}

const place = ({ x, y }: { x: number; y: number }) => ({ x, y })

const StationWord = ({ label }: { label: (typeof stationLabels)[number] }) => (
  <text className={label.inside ? 'section-label plain' : 'section-label'} {...place(label)}>
    {label.text}
  </text>
)

function Words() {
  return (
    <g textAnchor="middle">
      {stationLabels.map((label) => (
        <StationWord key={label.text} label={label} />
      ))}
      <text className="section-label plain rest" x="600" y="100">
        water at rest
      </text>
      <text className="section-label plain water" x="590" y="152">
        hydraulic grade line, water running
      </text>
      <text className="section-label plain loss" x="866" y="138" textAnchor="start">
        what the pipe loses
      </text>
    </g>
  )
}

interface CourseMarkProps {
  course: LongSectionProps['courses'][number]
  current: boolean
  small: boolean
}

function CourseMark({ course, current, small }: CourseMarkProps) {
  const { x, y, down } = courseMarks[course.number]!
  const radius = small ? 34 : 21
  return (
    <Link
      to={`/courses/${course.slug}`}
      className="section-mark"
      aria-label={`Course ${course.number}: ${course.title}`}
      aria-current={current ? 'page' : undefined}
    >
      <path d={`M${x} ${y + radius}V${down}`} strokeDasharray="2 5" />
      <circle cx={x} cy={y} r={radius} />
      <text x={x} y={y} dy="0.35em" textAnchor="middle">
        {course.number}
      </text>
    </Link>
  )
}

/** The part of the long section that a course is about. Needs a LongSection on the page, which holds the drawing. */
export function SectionSlice({ course }: { course: number }) {
  const { x, y, width, height } = courseSlices[course]!
  return (
    <svg className="section-slice" viewBox={`${x} ${y} ${width} ${height}`} aria-hidden="true">
      <use href={`#${sectionId}`} />
      <g textAnchor="middle">
        {stationLabels
          .filter(({ slices }) => slices.includes(course))
          .map((label) => (
            <StationWord key={label.text} label={label} />
          ))}
        {course === 5 && (
          <text className="section-label plain loss" x="754" y="178">
            what the pipe loses
          </text>
        )}
      </g>
    </svg>
  )
}
