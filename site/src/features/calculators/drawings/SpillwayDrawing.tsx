import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { Dimension, scalar, textWidth, type DrawingProps } from './Drawing.tsx'

const crest = 150
const tallest = 92

/** The bank of the leat with the crest let into it, and the water that stands over both; heights to one scale. */
export function SpillwayDrawing({ given, found }: DrawingProps) {
  const freeboard = scalar(given, 'freeboard')!
  const crestHead = scalar(found, 'crestHead')!
  const margin = scalar(found, 'margin')!
  const metres = (value: number) => join(format(value, 'length', { digits: 2, unit: 'm' }))
  const words = {
    water: `${metres(crestHead)} over crest`,
    margin: margin < 0 ? `${metres(-margin)} over bank` : `${metres(margin)} of bank left`,
    crest: `crest ${say(scalar(given, 'crestLength')!, 'length', 'm')} long`,
    flow: `${say(scalar(given, 'floodFlow')!, 'flow')} to spill`,
  }
  const scale = tallest / Math.max(freeboard, crestHead)
  const bank = crest - freeboard * scale
  const water = crest - crestHead * scale
  const colour = margin < 0 ? 'var(--rust)' : 'var(--ink)'

  return (
    <Framed
      name={`Spillway, ${words.crest}, ${words.flow}: water ${words.water}, ${words.margin}`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const right = narrow ? 24 : Math.max(textWidth(words.water), textWidth(words.margin)) + 36
        const end = width - right
        const [from, to] = [end * 0.22, end * 0.78]
        const line = end + 12
        /** Texts beside their dimension where there is room, a line apart at least. */
        const middle = (bank + water) / 2
        return {
          height: crest + (narrow ? 92 : 50),
          lines: (
            <g fill="none">
              <path
                d={`M${from} ${crest}H${to}L${to + ((crest - Math.max(water, bank)) / tallest) * 16} ${Math.max(water, bank)}${margin < 0 ? `H${end}V${water}H0V${bank}` : ''}H${from - ((crest - Math.max(water, bank)) / tallest) * 16}Z`}
                fill="var(--water-fill)"
              />
              <path
                d={
                  margin < 0
                    ? `M0 ${water}H${end}`
                    : `M${from - ((crest - water) / tallest) * 16} ${water}H${to + ((crest - water) / tallest) * 16}`
                }
                stroke="var(--water)"
                strokeWidth="2"
              />
              <path
                d={`M0 ${bank}H${from - ((crest - bank) / tallest) * 16}L${from} ${crest}H${to}L${to + ((crest - bank) / tallest) * 16} ${bank}H${end}`}
                stroke="var(--ink)"
                strokeWidth="2.5"
                strokeLinejoin="round"
              />
              <path
                d={`M${to} ${crest}H${line + 8}M${end} ${water}H${line + 8}M${end} ${bank}H${line + 8}`}
                stroke="var(--ink-2)"
                strokeDasharray="3 6"
              />
              <Dimension x={line} from={water} to={crest} colour="var(--water)" />
              <Dimension x={line} from={Math.min(bank, water)} to={Math.max(bank, water)} colour={colour} />
              <text x="0" y="16" fontSize="15" fill="var(--ink-2)">
                {words.flow}
              </text>
              <text
                x={narrow ? 0 : line + 12}
                y={narrow ? crest + 46 : Math.min(Math.max(middle, 46), crest - 20) + 5}
                fontSize="15"
                fontWeight="600"
                fill={colour}
              >
                {words.margin}
              </text>
              <text x={narrow ? 0 : line + 12} y={narrow ? crest + 67 : crest + 5} fontSize="15" fill="var(--water)">
                {words.water}
              </text>
              <text x="0" y={crest + 25} fontSize="15" fill="var(--ink-2)">
                {words.crest}
              </text>
            </g>
          ),
        }
      }}
    />
  )
}
