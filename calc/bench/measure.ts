/** The least over runs of the mean time of one call, in microseconds: whatever else the machine does only adds to it. */
export const time = (call: () => unknown, { runs = 15, milliseconds = 40 } = {}): number => {
  // Warm, but not for long: what takes a second is not called two hundred times first.
  const warm = performance.now() + milliseconds
  for (let i = 0; i < 200 && performance.now() < warm; i++) call()
  const means = Array.from({ length: runs }, () => {
    const end = performance.now() + milliseconds
    const start = performance.now()
    let calls = 0
    do {
      call()
      calls++
    } while (performance.now() < end)
    return ((performance.now() - start) * 1000) / calls
  })
  return Math.min(...means)
}

/** What was missed, in words. */
export const failures: string[] = []

export const row = (name: string, microseconds: number, figure?: number): void => {
  const missed = figure !== undefined && microseconds > figure
  if (missed) failures.push(`${name}: ${microseconds.toFixed(2)} µs, figure ${figure} µs`)
  const want = figure === undefined ? '' : `  figure ${figure} µs${missed ? '  MISSED' : ''}`
  console.log(`${name.padEnd(44)} ${microseconds.toFixed(2).padStart(10)} µs${want}`)
}
