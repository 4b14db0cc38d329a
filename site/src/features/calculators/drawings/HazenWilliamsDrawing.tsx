/** A length of pipe drawn as that of the friction calculator: what it shows does not hang on the formula. */
export { FrictionDrawing as HazenWilliamsDrawing } from './FrictionDrawing.tsx'
