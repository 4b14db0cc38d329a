import { scaleLinear } from 'd3-scale'
import { format, join } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { Dimension, scalar, textWidth, type DrawingProps } from './Drawing.tsx'

const top = 44
/** So many runs are drawn at most: more would only blacken the hill. */
const mostDrawn = 8

/** Each run as a stair up the hill, from the jet to the water at the intake, all to one scale of height. */
export function HeadByLevelsDrawing({ given, found }: DrawingProps) {
  const runs = given.runs as readonly (readonly number[])[]
  const head = scalar(found, 'grossHead')!
  const spread = join(format(scalar(found, 'misclosure')!, 'head', { digits: 2 }))
  const words = {
    head: `${join(format(head, 'head', { digits: 4 }))} of head`,
    runs: runs.length === 1 ? 'one run' : `${runs.length} runs, ${spread} apart`,
  }
  const stairs = runs.slice(0, mostDrawn).map((run) => {
    let height = 0
    return [0, ...run.map((rise) => (height += rise))]
  })
  const heights = stairs.flat()
  const [lowest, highest] = [Math.min(...heights, 0, head), Math.max(...heights, 0, head)]

  return (
    <Framed
      name={`Levels up the hill in ${words.runs}: ${words.head}`}
      draw={(width) => {
        const bottom = isNarrow(width) ? 190 : 236
        const right = width - 14
        const y = scaleLinear([lowest, highest === lowest ? lowest + 1 : highest], [bottom, top])
        const stair = (heights: readonly number[]) => {
          const step = (right - 34) / (heights.length - 1)
          return heights
            .slice(1)
            .map((height, i) => `H${12 + step * (i + 1)}V${y(height)}`)
            .join('')
        }
        return {
          height: bottom + 58,
          lines: (
            <g fill="none">
              <path d={`M0 ${y(head)}H${width}`} stroke="var(--water)" strokeWidth="1.5" strokeDasharray="3 6" />
              <path d={`M0 ${y(0)}H${width}`} stroke="var(--ink-2)" strokeWidth="1.5" strokeDasharray="3 6" />
              {stairs.map((heights, i) => (
                <path key={i} d={`M12 ${y(0)}${stair(heights)}`} stroke="var(--ink)" strokeWidth="1.5" />
              ))}
              <circle cx="12" cy={y(0)} r="4" fill="var(--ink)" />
              <Dimension x={right} from={y(Math.max(head, 0))} to={y(Math.min(head, 0))} />
              <text x="0" y="16" fontSize="15" fontWeight="600" fill="var(--ink)">
                {words.head}
              </text>
              <text x={width} y="16" textAnchor="end" fontSize="14" fill="var(--water)">
                {textWidth(words.head) + textWidth('water at intake') < width - 12 ? 'water at intake' : 'intake'}
              </text>
              <text x="0" y={bottom + 28} fontSize="14" fill="var(--ink-2)">
                jet’s centre line
              </text>
              <text x="0" y={bottom + 48} fontSize="15" fill="var(--ink-2)">
                {words.runs}
              </text>
            </g>
          ),
        }
      }}
    />
  )
}
