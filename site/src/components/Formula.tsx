import type * as Katex from 'katex'
import 'katex/dist/katex.min.css'
import { memo, useCallback, useState, useSyncExternalStore } from 'react'
import './formula.css'

/** KaTeX's script, once the first formula on a page has asked for it. */
let katex: typeof Katex.default | undefined
const waiting = new Set<() => void>()

const subscribe = (onLoad: () => void) => {
  waiting.add(onLoad)
  if (!katex)
    void import('katex').then((module) => {
      katex = module.default
      waiting.forEach((tell) => tell())
    })
  return () => waiting.delete(onLoad)
}

/** Marks a box that holds more than it shows, so that the keyboard can reach it to scroll. */
function useOverflow() {
  const [overflows, setOverflows] = useState(false)
  const box = useCallback((element: HTMLElement | null) => {
    if (!element) return
    const observer = new ResizeObserver(() => setOverflows(element.scrollWidth > element.clientWidth))
    observer.observe(element)
    return () => observer.disconnect()
  }, [])
  return [overflows, box] as const
}

interface FormulaProps {
  tex: string
  /** The same in words: what a screen reader says, and what stands there until the formula can be set. */
  speech: string
}

/** One formula. Its speech is its name; what is drawn is hidden from a screen reader, so that nothing is said twice. */
export const Formula = memo(function Formula({ tex, speech }: FormulaProps) {
  const setter = useSyncExternalStore(
    subscribe,
    () => katex,
    () => undefined,
  )
  const [overflows, box] = useOverflow()
  if (!setter) return <span className="formula-words">{speech}</span>
  const html = setter.renderToString(`\\displaystyle ${tex}`, { output: 'html', throwOnError: false, trust: false })
  return (
    <span
      ref={box}
      className="formula"
      role="math"
      aria-label={speech}
      tabIndex={overflows ? 0 : undefined}
      dangerouslySetInnerHTML={{ __html: html }}
    />
  )
})

const greek: Readonly<Record<string, string>> = {
  alpha: 'α',
  beta: 'β',
  gamma: 'γ',
  delta: 'δ',
  Delta: 'Δ',
  epsilon: 'ϵ',
  varepsilon: 'ε',
  zeta: 'ζ',
  eta: 'η',
  theta: 'θ',
  kappa: 'κ',
  lambda: 'λ',
  mu: 'μ',
  nu: 'ν',
  xi: 'ξ',
  pi: 'π',
  rho: 'ρ',
  sigma: 'σ',
  tau: 'τ',
  phi: 'φ',
  varphi: 'φ',
  psi: 'ψ',
  sum: 'Σ',
  omega: 'ω',
}

const plain = (tex: string) =>
  tex
    .replace(/\\(?:text|mathrm)\{([^{}]*)\}/g, '$1')
    // A mean is written with a bar over its letter.
    .replace(/\\bar\{?(\w)\}?/g, '$1\u0304')
    .replace(/\\([A-Za-z]+)\s*/g, (_, name: string) => greek[name] ?? name)
    .replace(/[{}]/g, '')

/** A symbol of one letter and its index, set without KaTeX: C_v, \eta_n. */
export function MathSymbol({ tex }: { tex: string }) {
  const [letter, ...index] = tex.split('_')
  return (
    <i className="math-symbol">
      {plain(letter!)}
      {index.length > 0 && <sub>{plain(index.join(' '))}</sub>}
    </i>
  )
}
