/**
 * Root of a continuous function between two points of opposite sign, by Brent's method (R. P. Brent, Algorithms for Minimization
 * without Derivatives, 1973, ch. 4). `tolerance` is relative to the root. Returns undefined when the ends do not bracket a root.
 */
export const bracketedRoot = (
  f: (x: number) => number,
  low: number,
  high: number,
  { tolerance = 1e-12, iterations = 200 }: { tolerance?: number; iterations?: number } = {},
): number | undefined => {
  let a = low
  let b = high
  let fa = f(a)
  let fb = f(b)
  if (fa === 0) return a
  if (fb === 0) return b
  if (!(fa * fb < 0)) return undefined
  let c = a
  let fc = fa
  let step = b - a
  let lastStep = step
  for (let i = 0; i < iterations; i++) {
    if (Math.abs(fc) < Math.abs(fb)) {
      a = b
      b = c
      c = a
      fa = fb
      fb = fc
      fc = fa
    }
    const near = 2 * Number.EPSILON * Math.abs(b) + 0.5 * tolerance * Math.abs(b)
    const middle = 0.5 * (c - b)
    if (Math.abs(middle) <= near || fb === 0) return b
    if (Math.abs(lastStep) >= near && Math.abs(fa) > Math.abs(fb)) {
      const s = fb / fa
      let p: number
      let q: number
      if (a === c) {
        p = 2 * middle * s
        q = 1 - s
      } else {
        const t = fa / fc
        const r = fb / fc
        p = s * (2 * middle * t * (t - r) - (b - a) * (r - 1))
        q = (t - 1) * (r - 1) * (s - 1)
      }
      if (p > 0) q = -q
      p = Math.abs(p)
      if (2 * p < Math.min(3 * middle * q - Math.abs(near * q), Math.abs(lastStep * q))) {
        lastStep = step
        step = p / q
      } else {
        step = middle
        lastStep = middle
      }
    } else {
      step = middle
      lastStep = middle
    }
    a = b
    fa = fb
    b += Math.abs(step) > near ? step : near * Math.sign(middle)
    fb = f(b)
    if (fb * fc > 0) {
      c = a
      fc = fa
      step = b - a
      lastStep = step
    }
  }
  return b
}
