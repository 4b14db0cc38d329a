import { format, unitFor, fieldText, join } from '#calc/units/format.ts'
import { DialGauge } from '../../../components/DialGauge.tsx'
import { scalar, type DrawingProps } from './Drawing.tsx'

/** Full scales that gauges are made with, to EN 837-1 (from memory), as parts of a decade. */
const fullScales = [1, 1.6, 2.5, 4, 6, 10]
/** A steady pressure stands at three quarters of the scale or under (EN 837-2, from memory). */
const mostOfScale = 0.75

const fullScaleFor = (pressure: number): number => {
  const wanted = pressure / mostOfScale
  const decade = 10 ** Math.floor(Math.log10(wanted))
  return decade * fullScales.find((part) => part * decade >= wanted * (1 - 1e-9))!
}

/** The gauge with both of its readings, on a dial that suits the static one. */
export function GaugeReadingDrawing({ given }: DrawingProps) {
  const still = scalar(given, 'staticPressure')!
  const running = scalar(given, 'runningPressure')!
  if (still === 0) return null
  const unit = unitFor('pressure', still).name
  const number = (pressure: number) => Number(fieldText(pressure, 'pressure', unit))
  const said = (pressure: number) => join(format(pressure, 'pressure', { unit }))
  return (
    <DialGauge
      name={`Pressure gauge: ${said(still)} static, ${said(running)} running`}
      fullScale={fullScaleFor(number(still))}
      unit={unit}
      needles={[
        { value: number(running), words: `running, ${said(running)}`, line: 'solid' },
        { value: number(still), words: `static, ${said(still)}`, line: 'outline' },
      ]}
    />
  )
}
