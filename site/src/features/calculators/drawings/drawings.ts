import type { ComponentType } from 'react'
import type { DrawingProps } from './Drawing.tsx'
import { JetDrawing } from './JetDrawing.tsx'

/** The drawing of each calculator that has one. */
export const drawings: Readonly<Record<string, ComponentType<DrawingProps> | undefined>> = {
  jet: JetDrawing,
}
