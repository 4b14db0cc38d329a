import { fieldText, format, join } from '#calc/units/format.ts'
import { DialGauge } from '../../../components/DialGauge.tsx'
import { scalar, type DrawingProps } from './Drawing.tsx'

const unit = 'bar'

/** The gauge to buy, with the pressure at rest and the surge on its dial. */
export function GaugeRangeDrawing({ given, found }: DrawingProps) {
  const still = scalar(given, 'staticPressure')!
  const surged = still + scalar(given, 'surgePressure')!
  const number = (pressure: number) => Number(fieldText(pressure, 'pressure', unit))
  const said = (pressure: number) => join(format(pressure, 'pressure', { unit }))
  const scale = scalar(found, 'chosenFullScale')!
  const errs = said(scalar(found, 'readingUncertainty')!)
  return (
    <DialGauge
      name={`Pressure gauge to ${said(scale)}: ${said(still)} static, ${said(surged)} in a surge; it may err by ${errs}`}
      fullScale={number(scale)}
      unit={unit}
      needles={[
        { value: number(still), words: `static ${said(still)}, may err by ${errs}`, line: 'solid' },
        { value: number(surged), words: `in a surge ${said(surged)}`, line: 'outline' },
      ]}
    />
  )
}
