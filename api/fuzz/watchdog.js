import { writeSync } from 'node:fs'
import { workerData } from 'node:worker_threads'

// Looks on from a thread of its own, because a calculation that never ends would keep its own thread from telling. Plain JavaScript: tsx
// reads no TypeScript in a worker. What is shared stands in watch.ts.
const { state, text, seconds } = workerData
let last = -1
let since = Date.now()
setInterval(() => {
  const [isBusy, turn, length] = [0, 1, 2].map((place) => Atomics.load(state, place))
  if (isBusy === 0 || turn !== last) {
    last = turn
    since = Date.now()
    return
  }
  if (Date.now() - since < seconds * 1000) return
  writeSync(2, `\nNo answer after ${seconds} s: ${new TextDecoder().decode(text.slice(0, length))}\n`)
  process.kill(process.pid, 'SIGKILL')
}, 250)
