import { useEffect, useRef, useState } from 'react'
import type { Sampled } from '#calc/uncertainty.ts'
import type { SamplingNews, SamplingOrder } from './monte-carlo-worker.ts'

export type Sampling =
  | { state: 'running'; done: number; of: number }
  | { state: 'done'; sampled: Sampled; order: SamplingOrder }
  | { state: 'failed'; say: string }

/** Monte Carlo in a worker of its own: started, watched, given up. */
export const useMonteCarlo = () => {
  const [sampling, setSampling] = useState<Sampling>()
  const worker = useRef<Worker>(undefined)

  const stop = () => {
    worker.current?.terminate()
    worker.current = undefined
  }
  useEffect(() => stop, [])

  const start = (order: SamplingOrder) => {
    stop()
    const one = new Worker(new URL('./monte-carlo-worker.ts', import.meta.url), { type: 'module' })
    worker.current = one
    const fail = (say: string) => {
      setSampling({ state: 'failed', say })
      stop()
    }
    one.addEventListener('message', ({ data }: MessageEvent<SamplingNews>) => {
      if ('done' in data) setSampling({ state: 'running', done: data.done, of: order.trials })
      else if ('refused' in data) fail(data.refused)
      else {
        setSampling({ state: 'done', sampled: data.sampled, order })
        stop()
      }
    })
    one.addEventListener('error', () => fail('The draws could not be made here. Try again.'))
    setSampling({ state: 'running', done: 0, of: order.trials })
    one.postMessage(order)
  }
  const giveUp = () => {
    stop()
    setSampling(undefined)
  }
  return { sampling, start, giveUp }
}
