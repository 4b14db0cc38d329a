/** Where things stand in the drawing of SectionDrawing.tsx, in its own units (a pixel each at full width). */

interface Label {
  text: string
  x: number
  y: number
  /** The slices, by course number, in which it is written too. */
  slices: readonly number[]
  /** Written in the powerhouse, not on the ground. */
  inside?: true
}

export const stationLabels: readonly Label[] = [
  { text: 'stream', x: 48, y: 130, slices: [1] },
  { text: 'intake', x: 124, y: 136, slices: [1] },
  { text: 'leat', x: 212, y: 142, slices: [1] },
  { text: 'forebay', x: 326, y: 168, slices: [2] },
  { text: 'pipe', x: 446, y: 260, slices: [2] },
  { text: 'valve and gauge', x: 770, y: 390, slices: [5] },
  { text: 'jet', x: 850, y: 390, slices: [3] },
  { text: 'runner', x: 896, y: 390, slices: [3] },
  { text: 'alternator', x: 956, y: 291, slices: [3, 4], inside: true },
  { text: 'cable', x: 1056, y: 418, slices: [4] },
  { text: 'load', x: 1120, y: 384, slices: [4] },
]

/** The mark of each course, and the thing under it that its line comes down to. */
export const courseMarks: Record<number, { x: number; y: number; down: number }> = {
  1: { x: 60, y: 38, down: 82 },
  2: { x: 440, y: 44, down: 192 },
  3: { x: 888, y: 184, down: 294 },
  4: { x: 1056, y: 236, down: 391 },
  5: { x: 790, y: 184, down: 279 },
}

/** The part of the drawing that belongs to each course, for a narrow screen. */
export const courseSlices: Record<number, { x: number; y: number; width: number; height: number }> = {
  1: { x: 0, y: 66, width: 254, height: 96 },
  2: { x: 290, y: 90, width: 254, height: 190 },
  3: { x: 762, y: 212, width: 254, height: 190 },
  4: { x: 918, y: 275, width: 242, height: 153 },
  5: { x: 640, y: 92, width: 254, height: 312 },
}

/** One line for the small drawing of a course's page. */
export const courseStations: Record<number, { text: string; x: number; y: number; anchor: 'start' | 'end' }> = {
  1: { text: 'stream', x: 20, y: 142, anchor: 'start' },
  2: { text: 'intake, leat, forebay, pipe', x: 84, y: 204, anchor: 'start' },
  3: { text: 'valve, jet, runner', x: 760, y: 402, anchor: 'start' },
  4: { text: 'alternator, cable, load', x: 1152, y: 423, anchor: 'end' },
  5: { text: 'the whole scheme, by its gauge', x: 690, y: 402, anchor: 'start' },
}
