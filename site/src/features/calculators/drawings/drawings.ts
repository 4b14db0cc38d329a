import type { ComponentType } from 'react'
import type { DrawingProps } from './Drawing.tsx'
import { FittingsDrawing } from './FittingsDrawing.tsx'
import { FrictionDrawing } from './FrictionDrawing.tsx'
import { GaugeDrawing } from './GaugeDrawing.tsx'
import { JetDrawing } from './JetDrawing.tsx'
import { PenstockDrawing } from './PenstockDrawing.tsx'
import { PowerDrawing } from './PowerDrawing.tsx'
import { RunnerDrawing } from './RunnerDrawing.tsx'

/** The drawing of each calculator that has one. */
export const drawings: Readonly<Record<string, ComponentType<DrawingProps> | undefined>> = {
  power: PowerDrawing,
  friction: FrictionDrawing,
  fittings: FittingsDrawing,
  penstock: PenstockDrawing,
  'gauge-reading': GaugeDrawing,
  jet: JetDrawing,
  runner: RunnerDrawing,
}
