import { scaleLinear } from 'd3-scale'
import { line } from 'd3-shape'
import type { PlainRow } from '#calc/index.ts'
import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { Dimension, rowsOf, scalar, textWidth, type DrawingProps } from './Drawing.tsx'

const top = 30
const rowHeight = 21

const at = (row: PlainRow, key: string) => row[key] as number

/** Where the pipe lies: along its profile, or straight down where there is none. */
const pipeLine = (profile: readonly PlainRow[], grossHead: number, length: number): [number, number][] =>
  profile.length > 0
    ? profile.map((point) => [at(point, 'distance'), at(point, 'elevation')])
    : [
        [0, grossHead],
        [length, 0],
      ]

/** The height of the pipe at a distance, between the points of its line. */
const heightAt = (points: readonly [number, number][], distance: number): number => {
  const next = points.findIndex(([x]) => x >= distance)
  if (next <= 0) return points[Math.max(next, 0)]![1]
  const [[x0, z0], [x1, z1]] = [points[next - 1]!, points[next]!]
  return z0 + ((z1 - z0) * (distance - x0)) / (x1 - x0)
}

/** A penstock in long section: its sections, the water at rest, and the grade line down to the net head. */
export function PenstockDrawing({ given, found }: DrawingProps) {
  const grossHead = scalar(given, 'grossHead')!
  const sections = rowsOf(given, 'sections')
  const gradeLine = rowsOf(found, 'gradeLine')
  const netHead = scalar(found, 'netHead')!
  const length = sections.reduce((sum, section) => sum + at(section, 'length'), 0)
  const profile = rowsOf(given, 'profile')
  const pipe = pipeLine(profile, grossHead, length)
  const largest = Math.max(...sections.map((section) => at(section, 'insideDiameter')))
  const words = {
    lost: `${join(format(scalar(found, 'headLoss')!, 'head'))} lost`,
    net: `${join(format(netHead, 'head'))} net`,
    sections: sections.map(
      (section) =>
        `${say(at(section, 'length'), 'length', 'm')} of ${say(at(section, 'insideDiameter'), 'length', 'mm')} bore`,
    ),
  }
  const starts = sections.map((_, i) => sections.slice(0, i).reduce((sum, section) => sum + at(section, 'length'), 0))
  const lowest = Math.min(0, ...pipe.map(([, z]) => z))
  const highest = Math.max(grossHead, ...pipe.map(([, z]) => z))

  return (
    <Framed
      name={`Penstock: ${words.sections.join(', then ')}. Of ${say(grossHead, 'head')} of head, ${words.lost}, ${words.net}.`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const right = Math.max(textWidth(words.lost), textWidth(words.net)) + 26
        const bottom = narrow ? 190 : 236
        const x = scaleLinear([0, length], [4, width - right])
        const y = scaleLinear([lowest, highest], [bottom, top])
        const draw = line<[number, number]>(
          ([distance]) => x(distance),
          ([, height]) => y(height),
        )
        const between = (from: number, to: number): [number, number][] => [
          [from, heightAt(pipe, from)],
          ...pipe.filter(([distance]) => distance > from && distance < to),
          [to, heightAt(pipe, to)],
        ]
        const bracket = width - right + 12
        const lossMiddle = Math.max((y(grossHead) + y(netHead)) / 2, top)
        return {
          height: bottom + 26 + rowHeight * (sections.length + (profile.length > 0 ? 0 : 1)),
          lines: (
            <g fill="none">
              <path
                d={`M${x(0)} ${y(grossHead)}H${bracket}`}
                stroke="var(--water)"
                strokeWidth="1.5"
                strokeDasharray="3 6"
              />
              {sections.map((section, i) => {
                const path = draw(between(starts[i]!, starts[i]! + at(section, 'length')))!
                const thickness = 4 + (8 * at(section, 'insideDiameter')) / largest
                return (
                  <g key={i}>
                    <path d={path} stroke="var(--ink)" strokeWidth={thickness + 4} strokeLinejoin="round" />
                    <path d={path} stroke="var(--water-fill)" strokeWidth={thickness} strokeLinejoin="round" />
                  </g>
                )
              })}
              <path
                d={draw(gradeLine.map((point) => [at(point, 'distance'), at(point, 'hydraulicGrade')]))!}
                stroke="var(--water)"
                strokeWidth="2.5"
              />
              <Dimension x={bracket} from={y(grossHead)} to={y(netHead)} colour="var(--rust)" />
              <Dimension x={bracket} from={y(netHead)} to={y(0)} />
              <text x="0" y={16} fontSize="14" fill="var(--ink-2)">
                water at rest, {say(grossHead, 'head')}
              </text>
              <text x={bracket + 10} y={lossMiddle + 5} fontSize="15" fontWeight="600" fill="var(--rust)">
                {words.lost}
              </text>
              <text
                x={bracket + 10}
                y={Math.max((y(netHead) + y(0)) / 2, lossMiddle + 20) + 5}
                fontSize="15"
                fill="var(--ink)"
              >
                {words.net}
              </text>
              {sections.map((_, i) => (
                <g key={i}>
                  <circle
                    cx={x(starts[i]!)}
                    cy={y(heightAt(pipe, starts[i]!))}
                    r="3.5"
                    fill="var(--paper)"
                    stroke="var(--ink)"
                    strokeWidth="2"
                  />
                  <text x="0" y={bottom + 32 + rowHeight * i} fontSize="15" fill="var(--ink-2)">
                    {sections.length > 1 && `${i + 1}: `}
                    {words.sections[i]}
                  </text>
                </g>
              ))}
              {profile.length === 0 && (
                <text x="0" y={bottom + 32 + rowHeight * sections.length} fontSize="14" fill="var(--ink-2)">
                  drawn straight: no profile given
                </text>
              )}
            </g>
          ),
        }
      }}
    />
  )
}
