import { createUnitClass } from 'mathjs'

/** What is used of the unit library's own class. */
interface LibraryUnit {
  dimensions: number[]
  toNumber(unit: string): number
}

declare module 'mathjs' {
  // Exported by the library, missing in its types.
  const createUnitClass: (parts: Readonly<Record<string, unknown>>) => new (value: number, unit: string) => LibraryUnit
}

/** The library writes two temperature factors as fractions; as numbers they serve as well. */
class Quotient {
  constructor(
    private readonly above: number,
    private readonly below = 1,
  ) {}
  valueOf() {
    return this.above / this.below
  }
}

/** Of the other kinds of numbers that the library can reckon in there are none here. */
class None {}

/**
 * mathjs's units on plain numbers. Its whole `unit` brings big numbers, fractions, complex numbers and matrices along, five times the
 * weight in every browser; the class asks only for these few operations.
 */
const Unit = createUnitClass({
  config: { number: 'number', predictable: false, relTol: 1e-12, absTol: 1e-15 },
  addScalar: (a: number, b: number) => Number(a) + Number(b),
  subtractScalar: (a: number, b: number) => Number(a) - Number(b),
  multiplyScalar: (a: number, b: number) => Number(a) * Number(b),
  divideScalar: (a: number, b: number) => Number(a) / Number(b),
  pow: Math.pow,
  abs: Math.abs,
  fix: Math.trunc,
  round: Math.round,
  equal: (a: number, b: number) => a === b,
  isNumeric: (value: unknown) => typeof value === 'number',
  format: String,
  number: Number,
  Complex: None,
  BigNumber: None,
  Fraction: Quotient,
})

/** A value in a unit of the library's spelling; throws where it does not know the unit. */
export const libraryUnit = (value: number, unit: string): LibraryUnit => new Unit(value, unit)
