import { Worker } from 'node:worker_threads'

export interface Watched {
  /** Whether something is being worked out, its number, and how long its text is. */
  state: Int32Array<SharedArrayBuffer>
  /** What is being worked out. */
  text: Uint8Array<SharedArrayBuffer>
  seconds: number
}

/** Runs calculations that may never end: one that takes so many seconds is told, and ends this process. */
export function watch(seconds: number): {
  run: <T>(name: string, calculation: () => T) => T
  stop: () => Promise<unknown>
} {
  const state = new Int32Array(new SharedArrayBuffer(12))
  const text = new Uint8Array(new SharedArrayBuffer(16_384))
  const worker = new Worker(new URL('./watchdog.js', import.meta.url), {
    workerData: { state, text, seconds } satisfies Watched,
  })
  const local = new Uint8Array(text.length)
  return {
    run(name, calculation) {
      const { written } = new TextEncoder().encodeInto(name, local)
      text.set(local)
      Atomics.store(state, 2, written)
      Atomics.add(state, 1, 1)
      Atomics.store(state, 0, 1)
      try {
        return calculation()
      } finally {
        Atomics.store(state, 0, 0)
      }
    },
    stop: () => worker.terminate(),
  }
}
