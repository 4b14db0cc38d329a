import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { Dimension, scalar, type DrawingProps } from './Drawing.tsx'

const bar = 26
const top = 34

/** A fall of water beside what it is worth: all of its power, what comes out, and what stays on the way. */
export function PowerDrawing({ given, found }: DrawingProps) {
  const head = scalar(given, 'netHead')!
  const flow = scalar(given, 'flow')!
  const inWater = scalar(found, 'hydraulicPower')!
  const out = scalar(found, 'outputPower')!
  const words = {
    head: say(head, 'head'),
    flow: join(format(flow, 'flow')),
    inWater: `${join(format(inWater, 'power'))} in the water`,
    out: `${join(format(out, 'power'))} got out`,
    lost: `${join(format(inWater - out, 'power'))} lost on the way`,
  }
  // Neither leaves its place, however large: half of it stands for 30 m, and for 20 L/s.
  const fall = 24 + (124 * head) / (head + 30)
  const stream = 3 + (26 * flow) / (flow + 0.02)
  const share = inWater === 0 ? 0 : out / inWater

  return (
    <Framed
      name={`${words.flow} falling ${words.head}: ${words.inWater}, ${words.out}, ${words.lost}`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const foot = top + 148
        const lip = foot - fall
        const barsAt = narrow ? 0 : 250
        const barsTop = narrow ? foot + 44 : top + 6
        const longest = width - barsAt
        const bars = [
          { words: words.inWater, from: 0, share: 1, fill: 'var(--water-fill)', line: 'var(--water)' },
          { words: words.out, from: 0, share, fill: 'var(--brass-fill)', line: 'var(--brass)' },
          { words: words.lost, from: share, share: 1 - share, fill: 'var(--rust-fill)', line: 'var(--rust)' },
        ]
        return {
          height: narrow ? barsTop + 3 * 58 : foot + 34,
          lines: (
            <g fill="none">
              <path d={`M0 ${lip}H62V${foot}H0Z`} fill="var(--earth-fill)" />
              <path d={`M0 ${lip}H62V${foot}H190`} stroke="var(--earth)" strokeWidth="2.5" />
              <path
                d={`M0 ${lip - stream / 2}H${62 + stream / 2}V${foot}`}
                stroke="var(--water-fill)"
                strokeWidth={stream}
                strokeLinejoin="round"
              />
              <path d={`M0 ${lip - stream}H${62 + stream}V${foot}`} stroke="var(--water)" strokeWidth="2" />
              <Dimension x={114} from={lip} to={foot} />
              <text x={124} y={(lip + foot) / 2 + 5} fontSize="15" fill="var(--ink)">
                {words.head}
              </text>
              <text x="0" y={lip - stream - 12} fontSize="15" fill="var(--water)">
                {words.flow}
              </text>
              {bars.map(({ words, from, share, fill, line }, i) => {
                const y = barsTop + i * 58
                return (
                  <g key={words}>
                    <text x={barsAt} y={y} fontSize="15" fill="var(--ink)">
                      {words}
                    </text>
                    <path
                      d={`M${barsAt + from * longest + 1} ${y + 8}h${Math.max(share * longest - 2, 0)}v${bar}H${barsAt + from * longest + 1}z`}
                      fill={fill}
                      stroke={line}
                      strokeWidth="1.5"
                    />
                  </g>
                )
              })}
            </g>
          ),
        }
      }}
    />
  )
}
