import { memo, type ReactNode } from 'react'
import { speak, spoken } from '#calc/formula.ts'
import type { PrintedStep } from '#calc/index.ts'
import { Formula } from './Formula.tsx'
import './working.css'

const plainUnit = (tex: string) =>
  tex
    .replace(/\^\\circ\s*/g, '°')
    .replace('^3', '³')
    .replace('^2', '²')
    .replace('\\,', '·')
    .replace(/\\(?=[% ])/g, '')

/** A formula with numbers in words: grouped digits are one number, a unit is said as it is written. */
const spokenNumbers = (tex: string) =>
  speak(
    tex
      .replaceAll('{\\,}', '')
      .replace(/(?:\\;)?\\mathrm\{([^{}]*)\}/g, (_, unit: string) => spoken(plainUnit(unit)))
      .replace(/\^\\circ/g, spoken('degrees')),
  )

interface WorkingProps {
  steps: readonly PrintedStep[]
  /** What stands below a step, such as a blank to fill. */
  after?: (step: PrintedStep) => ReactNode
}

/** The steps of a calculation: what is done, the formula, and the formula with the numbers put in. */
export const Working = memo(function Working({ steps, after }: WorkingProps) {
  return (
    <ol className="working">
      {steps.map((step, i) => (
        <li key={i}>
          {step.say}
          {step.symbols && step.speech && <Formula tex={step.symbols} speech={step.speech} />}
          {step.numbers && <Formula tex={step.numbers} speech={spokenNumbers(step.numbers)} />}
          {after?.(step)}
        </li>
      ))}
    </ol>
  )
})
