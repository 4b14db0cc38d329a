import { lazy, type ComponentType } from 'react'

/** The drawings that lessons call for by name. */
export const drawings: Record<string, ComponentType> = {
  'fall-to-the-jet': lazy(async () => ({ default: (await import('./FallToTheJet.tsx')).FallToTheJet })),
  'power-chain': lazy(async () => ({ default: (await import('./PowerChain.tsx')).PowerChain })),
  'grade-line-falls': lazy(async () => ({ default: (await import('./GradeLineFalls.tsx')).GradeLineFalls })),
  'outside-and-inside': lazy(async () => ({ default: (await import('./OutsideAndInside.tsx')).OutsideAndInside })),
  'jet-thins-with-head': lazy(async () => ({ default: (await import('./JetThinsWithHead.tsx')).JetThinsWithHead })),
  'jet-draws-in': lazy(async () => ({ default: (await import('./JetDrawsIn.tsx')).JetDrawsIn })),
  'pitch-circle': lazy(async () => ({ default: (await import('./PitchCircle.tsx')).PitchCircle })),
  'what-the-gauge-shows': lazy(async () => ({ default: (await import('./WhatTheGaugeShows.tsx')).WhatTheGaugeShows })),
  'five-readings': lazy(async () => ({ default: (await import('./FiveReadings.tsx')).FiveReadings })),
}
