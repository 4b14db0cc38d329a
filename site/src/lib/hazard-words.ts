import type { Hazard } from '#calc/definition.ts'

/** What can hurt, in words. */
export const hazardWords: Readonly<Record<Hazard, string>> = {
  pressure: 'water under pressure',
  electricity: 'electricity',
  stream: 'work in and near a stream',
  'hot-work': 'heat, flame and fumes',
  rotating: 'turning machinery',
  lifting: 'heavy lifts',
  digging: 'trenches and buried services',
}
