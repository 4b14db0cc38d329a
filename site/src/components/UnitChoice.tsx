import { useId } from 'react'
import type { UnitSystem } from '#calc/units/system.ts'
import { preferUnits } from '../lib/unit-preference.ts'
import './unit-choice.css'

const systems: readonly { system: UnitSystem; words: string }[] = [
  { system: 'metric', words: 'metric' },
  { system: 'imperial', words: 'imperial' },
]

/** The units that results are shown in; a number may be written in any. */
export function UnitChoice({ chosen }: { chosen: UnitSystem }) {
  const name = useId()
  return (
    <fieldset className="unit-choice no-print">
      <legend>Units</legend>
      {systems.map(({ system, words }) => (
        <label key={system}>
          <input type="radio" name={name} checked={chosen === system} onChange={() => preferUnits(system)} />
          {words}
        </label>
      ))}
    </fieldset>
  )
}
