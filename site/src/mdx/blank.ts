import type { Quantity } from '#calc/index.ts'
import { parse } from '#calc/units/parse.ts'

const tolerance = 0.01

export type Check = { right: true } | { right: false; hint: string }

/** How many tens a number is out by, where its figures are right. */
const tensOut = (share: number): number | undefined => {
  const power = Math.round(Math.log10(share))
  return power !== 0 && Math.abs(share / 10 ** power - 1) <= tolerance ? power : undefined
}

/** Whether what was written for a blank is right, to one per cent; a hint otherwise, which does not give the number away. */
export function checkBlank(text: string, quantity: Quantity, answer: number): Check {
  const reading = parse(text, quantity)
  if (!reading.ok) return { right: false, hint: reading.message }
  if (Math.abs(reading.value - answer) <= tolerance * Math.abs(answer)) return { right: true }
  const share = reading.value / answer
  if (!(share > 0)) return { right: false, hint: 'Look at the sign, and whether it can be nought.' }
  const power = tensOut(share)
  if (power !== undefined) {
    const factor = (10 ** Math.abs(power)).toLocaleString('en-GB').replaceAll(',', '\u00a0')
    return {
      right: false,
      hint: `The figures are right, but it is ${factor} times too ${power > 0 ? 'large' : 'small'}: look at the unit.`,
    }
  }
  return {
    right: false,
    hint: `Too ${share > 1 ? 'large' : 'small'}. Put the numbers into the formula again, all of them in metres, seconds, watts and the like.`,
  }
}
