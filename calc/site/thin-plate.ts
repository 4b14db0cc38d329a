import type { Caution } from '../definition.ts'

/** What every thin-plate weir wants, whatever its notch: ISO 1438:2017, installation and measurement of head. */
export const thinPlateCautions = [
  {
    level: 'check',
    about: ['head'],
    say: 'Read the head well upstream of the plate, about four heads back, where the surface has not begun to draw down; measure it from the lowest point of the crest by a level, not along the plate.',
  },
  {
    level: 'check',
    about: ['flow'],
    say: 'The edge must be sharp and square upstream, 1 to 2 mm thick, the plate plumb and tight; the sheet of water must spring clear with air under it, and the water below stand under the crest.',
  },
  {
    level: 'check',
    about: ['flow'],
    hazard: 'stream',
    say: 'A weir ponds the stream and bars fish: ask the authority first, local code rules it. Keep out of the water above and below it in high flow, and lift the plate with two.',
  },
] as const satisfies readonly Caution<'head' | 'flow'>[]
