const golden = 0.5 * (3 - Math.sqrt(5))

/**
 * Minimum of a function with one minimum between two points, by Brent's method (R. P. Brent, 1973, ch. 5): golden section with
 * parabolic steps. `tolerance` is relative to x; near a smooth minimum half of the digits of a double are to be had.
 */
export const bracketedMinimum = (
  f: (x: number) => number,
  low: number,
  high: number,
  { tolerance = 1e-8, iterations = 200 }: { tolerance?: number; iterations?: number } = {},
): number => {
  let a = low
  let b = high
  let x = a + golden * (b - a)
  let w = x
  let v = x
  let fx = f(x)
  let fw = fx
  let fv = fx
  let step = 0
  let lastStep = 0
  for (let i = 0; i < iterations; i++) {
    const middle = 0.5 * (a + b)
    const near = tolerance * Math.abs(x) + Number.EPSILON
    if (Math.abs(x - middle) <= 2 * near - 0.5 * (b - a)) return x
    let parabolic = false
    if (Math.abs(lastStep) > near) {
      const r = (x - w) * (fx - fv)
      let q = (x - v) * (fx - fw)
      let p = (x - v) * q - (x - w) * r
      q = 2 * (q - r)
      if (q > 0) p = -p
      q = Math.abs(q)
      if (Math.abs(p) < Math.abs(0.5 * q * lastStep) && p > q * (a - x) && p < q * (b - x)) {
        lastStep = step
        step = p / q
        if (x + step - a < 2 * near || b - (x + step) < 2 * near) step = near * Math.sign(middle - x)
        parabolic = true
      }
    }
    if (!parabolic) {
      lastStep = x < middle ? b - x : a - x
      step = golden * lastStep
    }
    const u = x + (Math.abs(step) >= near ? step : near * Math.sign(step))
    const fu = f(u)
    if (fu <= fx) {
      if (u < x) b = x
      else a = x
      v = w
      fv = fw
      w = x
      fw = fx
      x = u
      fx = fu
    } else {
      if (u < x) a = u
      else b = u
      if (fu <= fw || w === x) {
        v = w
        fv = fw
        w = u
        fw = fu
      } else if (fu <= fv || v === x || v === w) {
        v = u
        fv = fu
      }
    }
  }
  return x
}
