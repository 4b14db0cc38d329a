import { Button } from '@radix-ui/themes'
import { useId, useRef, useState, type FormEvent } from 'react'
import type { Quantity } from '#calc/index.ts'
import { quantities } from '#calc/units/quantities.ts'
import { UntilReady } from '../components/UntilReady.tsx'
import { MathSymbol } from '../components/Formula.tsx'
import { checkBlank, type Check } from './blank.ts'

const triesBeforeShowing = 2

interface BlankProps {
  label: string
  /** TeX. */
  symbol?: string
  quantity: Quantity
  answer: number
  /** The answer as it is said. */
  shown: string
  onFilled: () => void
}

/** One number for the learner to fill in: checked at once, a hint when it is wrong, and shown when two tries were not enough. */
export function Blank({ label, symbol, quantity, answer, shown, onFilled }: BlankProps) {
  const id = useId()
  const input = useRef<HTMLInputElement>(null)
  const [text, setText] = useState('')
  const [check, setCheck] = useState<Check>()
  const [tries, setTries] = useState(0)
  const [gaveUp, setGaveUp] = useState(false)

  /** The buttons go; the keyboard stays where it was. */
  const settle = () => {
    input.current?.focus()
    onFilled()
  }
  const send = (event: FormEvent) => {
    event.preventDefault()
    const result = checkBlank(text, quantity, answer)
    setCheck(result)
    if (result.right) settle()
    else setTries(tries + 1)
  }
  const show = () => {
    setGaveUp(true)
    settle()
  }

  const wrong = check?.right === false && !gaveUp ? check.hint : undefined
  const isOver = check?.right === true || gaveUp
  return (
    <form className="blank" onSubmit={send} noValidate>
      <label htmlFor={id}>
        {label} {symbol && <MathSymbol tex={symbol} />}
      </label>
      <UntilReady>
        <div className="blank-line">
          <input
            ref={input}
            id={id}
            className={wrong ? 'blank-wrong' : undefined}
            value={text}
            onChange={(event) => setText(event.target.value)}
            readOnly={isOver}
            autoComplete="off"
            spellCheck={false}
            aria-describedby={`${id}-unit ${id}-said`}
            aria-invalid={wrong ? true : undefined}
          />
          {!isOver && (
            <Button type="submit" size="3" variant="outline">
              Check
            </Button>
          )}
          {!isOver && tries >= triesBeforeShowing && (
            <Button type="button" size="3" variant="outline" color="gray" onClick={show}>
              Show me
            </Button>
          )}
        </div>
      </UntilReady>
      <p className="blank-help" id={`${id}-unit`}>
        {quantities[quantity].units.some(({ name }) => name === '')
          ? `A number, such as ${quantities[quantity].example}.`
          : `With its unit, such as ${quantities[quantity].example}.`}
      </p>
      <p id={`${id}-said`} className={isOver ? 'blank-said' : 'blank-said blank-hint'} role="status">
        {check?.right && <strong className="blank-right">✓ Right.</strong>}
        {gaveUp && (
          <>
            It is <strong>{shown}</strong>.
          </>
        )}
        {wrong && (
          <>
            <strong>Not yet.</strong> {wrong}
          </>
        )}
      </p>
    </form>
  )
}
