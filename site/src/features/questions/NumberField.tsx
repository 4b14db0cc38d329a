import { useId, useState } from 'react'
import { QuantityField } from '../../components/QuantityField.tsx'
import { joinNumber, splitNumber, type NumberText } from './answers.ts'

interface NumberFieldProps {
  field: { units: readonly string[]; figures?: number }
  label: string
  text: string
  write: (text: string) => void
}

/** Stands where no unit is chosen yet. */
const noUnitYet = 'unit?'

/** A number and its unit: the unit is part of the answer, so none is chosen beforehand where there are several. */
export function NumberField({ field: { units, figures }, label, text, write }: NumberFieldProps) {
  const id = useId()
  // Kept apart while they are written: a unit written behind the number must not jump into the list.
  const [written, setWritten] = useState<NumberText>(() => {
    const { number, unit } = splitNumber(text, units)
    return { number, unit: units.length === 1 ? units[0]! : unit }
  })
  const change = (part: Partial<NumberText>) => {
    const next = { ...written, ...part }
    setWritten(next)
    write(joinNumber(next))
  }
  const mustChoose = units.length > 1 && !units.includes('')
  return (
    <QuantityField
      id={id}
      label={label}
      help={figures === undefined ? undefined : `to ${figures} significant figures`}
      text={written.number}
      unit={written.unit === '' && mustChoose ? noUnitYet : written.unit}
      units={mustChoose ? [noUnitYet, ...units] : units}
      negative
      onText={(number) => change({ number })}
      onUnit={(unit) => change({ unit: unit === noUnitYet ? '' : unit })}
    />
  )
}
