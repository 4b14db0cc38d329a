/** Draws the inputs again and again beside the page, so that the page stays quick. */
import { loaders } from 'virtual:calculator-loaders'
import { CalculationError } from '#calc/errors.ts'
import type { Inputs, StandardUncertainties } from '#calc/index.ts'
import { monteCarloOf, type Sampled } from '#calc/uncertainty.ts'

export interface SamplingOrder {
  id: string
  inputs: Inputs
  uncertainties: StandardUncertainties
  trials: number
  seed: string
}
export type SamplingNews = { done: number } | { sampled: Sampled } | { refused: string }

const tell = (news: SamplingNews) => postMessage(news)

addEventListener('message', ({ data }: MessageEvent<SamplingOrder>) => void sample(data))

async function sample({ id, inputs, uncertainties, trials, seed }: SamplingOrder) {
  const definition = await loaders[id]!()
  try {
    tell({
      sampled: monteCarloOf(definition, inputs, uncertainties, { trials, seed, onProgress: (done) => tell({ done }) }),
    })
  } catch (error) {
    if (!(error instanceof CalculationError)) throw error
    tell({ refused: error.message })
  }
}
