import type { ComponentType } from 'react'
import { loadOnce } from '../../lib/load-once.ts'
import type { DrawingProps } from './drawings/Drawing.tsx'

type Drawing = ComponentType<DrawingProps>

const files = import.meta.glob<Record<string, Drawing | undefined>>('./drawings/*?Drawing.tsx')

/** `gauge-reading` → `GaugeReadingDrawing`: a drawing is found by the name of its calculator. */
const nameOf = (id: string) => `${id.replace(/(?:^|-)([a-z])/g, (_, letter: string) => letter.toUpperCase())}Drawing`

/** The drawing of a calculator, from its own chunk; undefined for one that has none. */
export const loadDrawing = loadOnce(async (id): Promise<Drawing | undefined> => {
  const name = nameOf(id)
  return (await files[`./drawings/${name}.tsx`]?.())?.[name]
})
