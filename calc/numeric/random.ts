/**
 * Repeatable random numbers in [0, 1) from a text: sfc32 (C. Doty-Humphrey, PractRand), its state filled from the text by FNV-1a with
 * four different starts. For drawing questions and Monte Carlo runs, never for secrets.
 */
export const seededRandom = (seed: string): (() => number) => {
  const hash = (start: number) => {
    let h = start
    for (let i = 0; i < seed.length; i++) h = Math.imul(h ^ seed.charCodeAt(i), 0x01000193)
    return h | 0
  }
  let [a, b, c, d] = [hash(0x811c9dc5), hash(0x9e3779b9), hash(0x85ebca6b), hash(0xc2b2ae35)]
  const next = () => {
    const t = (((a + b) | 0) + d) | 0
    d = (d + 1) | 0
    a = b ^ (b >>> 9)
    b = (c + (c << 3)) | 0
    c = (((c << 21) | (c >>> 11)) + t) | 0
    return (t >>> 0) / 4294967296
  }
  for (let i = 0; i < 16; i++) next()
  return next
}

/** Two standard normal numbers by Box and Muller (1958). */
export const normalPair = (random: () => number): [number, number] => {
  const radius = Math.sqrt(-2 * Math.log(1 - random()))
  const angle = 2 * Math.PI * random()
  return [radius * Math.cos(angle), radius * Math.sin(angle)]
}
