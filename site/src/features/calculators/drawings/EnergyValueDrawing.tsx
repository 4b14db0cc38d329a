import { scaleLinear } from 'd3-scale'
import { format, join, say } from '#calc/units/format.ts'
import { Framed, isNarrow } from '../../../components/Framed.tsx'
import { scalar, type DrawingProps } from './Drawing.tsx'

const top = 54

/** The hole that the plant's cost digs, and how the years' gains fill it, without interest. */
export function EnergyValueDrawing({ given, found }: DrawingProps) {
  const capital = scalar(given, 'capitalCost')!
  const years = scalar(given, 'lifeYears')!
  const payback = scalar(found, 'simplePayback')
  const gain = scalar(found, 'yearlyValue')! - scalar(given, 'yearlyCost')!
  const end = gain * years - capital
  const isPaid = payback !== undefined && payback < years
  const words = {
    cost: `cost ${join(format(capital, 'money'))}`,
    payback: payback === undefined ? 'never paid back' : `paid back after ${join(format(payback, 'years'))}`,
    gain: `${join(format(gain, 'money'))} a year`,
    years: say(years, 'years'),
    worth: `worth ${join(format(scalar(found, 'netPresentValue')!, 'money'))} today`,
  }

  return (
    <Framed
      name={`A plant of ${join(format(capital, 'money'))} over ${words.years}, ${words.gain}: ${words.payback}, with interest ${words.worth}`}
      draw={(width) => {
        const narrow = isNarrow(width)
        const bottom = narrow ? 200 : 226
        const x = scaleLinear([0, years], [2, width - 2])
        // Some of the hole and some of the sky are always seen, and a plant that costs nothing digs none.
        const lowest = Math.min(-capital, end, -1e-9)
        const highest = Math.max(end, -0.15 * lowest)
        const y = scaleLinear([lowest, highest], [bottom, top])
        const zero = y(0)
        const crossing = isPaid ? x(payback) : x(years)
        const fill = `M${x(0)} ${zero}V${y(-capital)}L${crossing} ${isPaid ? zero : y(end)}V${zero}z`
        return {
          height: bottom + (narrow ? 52 : 34),
          lines: (
            <g fill="none">
              <path d={fill} fill="var(--rust-fill)" />
              {isPaid && <path d={`M${crossing} ${zero}L${x(years)} ${y(end)}V${zero}z`} fill="var(--brass-fill)" />}
              <path
                d={`M${x(0)} ${zero}V${y(-capital)}L${x(years)} ${y(end)}V${zero}`}
                stroke="var(--ink)"
                strokeWidth="2"
                strokeLinejoin="round"
              />
              <path d={`M0 ${zero}H${width}`} stroke="var(--earth)" strokeWidth="2.5" />
              {isPaid && <circle cx={crossing} cy={zero} r="5" fill="var(--ink)" />}
              <text x="0" y="16" fontSize="15" fontWeight="600" fill="var(--ink)">
                {words.payback}
              </text>
              <text
                x={narrow ? 0 : width}
                y={narrow ? 38 : 16}
                textAnchor={narrow ? 'start' : 'end'}
                fontSize="15"
                fill="var(--ink)"
              >
                {words.worth}
              </text>
              <text x="0" y={bottom + 22} fontSize="15" fill="var(--rust)">
                {words.cost}
              </text>
              <text x={width} y={bottom + 22} textAnchor="end" fontSize="15" fill="var(--ink-2)">
                {words.years}
              </text>
              <text
                x={narrow ? 0 : width / 2}
                y={bottom + (narrow ? 42 : 22)}
                textAnchor={narrow ? 'start' : 'middle'}
                fontSize="15"
                fill="var(--ink-2)"
              >
                {words.gain}, without interest
              </text>
            </g>
          ),
        }
      }}
    />
  )
}
