/** How high the water stands on the plate: 0 empty, 1 full. */
export const waterLevel = (done: number, of: number) => (of > 0 ? Math.min(Math.max(done / of, 0), 1) : 0)

/** The long graduations of a plate of this length, one a lesson and one at zero; and the short ones, four between. */
export function graduations(of: number, length: number) {
  const step = length / of
  const long = Array.from({ length: of + 1 }, (_, lesson) => ({ lesson, at: lesson * step }))
  const short = long.slice(0, -1).flatMap(({ at }) => [1, 2, 3, 4].map((fifth) => at + (fifth * step) / 5))
  return { long, short }
}
