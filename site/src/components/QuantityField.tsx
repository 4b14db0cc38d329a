import type { ReactNode } from 'react'
import { MathSymbol } from './Formula.tsx'
import { PlusMinus } from './PlusMinus.tsx'
import './quantity-field.css'

interface FieldFrameProps {
  id: string
  label: string
  /** TeX. */
  symbol?: string
  help?: string
  /** What to write instead. */
  error?: string
  /** What else concerns this field: cautions. */
  after?: ReactNode
}

export interface QuantityFieldProps extends FieldFrameProps {
  text: string
  unit: string
  /** The units to choose from. */
  units: readonly string[]
  /** Numbers only, for the keys that a phone shows. */
  negative?: boolean
  /** It may be written with ±. */
  uncertain?: boolean
  onText: (text: string) => void
  onUnit: (unit: string) => void
}

export interface ChoiceFieldProps extends FieldFrameProps {
  value: string
  options: readonly { value: string; words: string }[]
  onChoose: (value: string) => void
}

const helpId = (id: string) => `${id}-help`
const errorId = (id: string) => `${id}-error`

const describedBy = ({ id, help, error }: FieldFrameProps) =>
  [error && errorId(id), help && helpId(id)].filter(Boolean).join(' ') || undefined

function FieldFrame({ id, label, symbol, help, error, after, children }: FieldFrameProps & { children: ReactNode }) {
  return (
    <div className="field">
      <p className="field-head">
        <label htmlFor={id}>{label}</label>{' '}
        {symbol && (
          <span className="field-symbol" aria-hidden="true">
            <MathSymbol tex={symbol} />
          </span>
        )}{' '}
        {help && (
          <span className="field-help" id={helpId(id)}>
            {help}
          </span>
        )}
      </p>
      {children}
      {error && (
        <p className="field-error" id={errorId(id)}>
          {error}
        </p>
      )}
      {after}
    </div>
  )
}

/** A dimensionless number's unit has no name of its own: a share is said as a per cent or as a part of one. */
export const unitWords = (unit: string) => (unit === '' ? 'of 1' : unit)

/** A number with its unit, kept as it is written. The unit can be chosen, or written behind the number. */
export function QuantityField({
  text,
  unit,
  units,
  negative,
  uncertain,
  onText,
  onUnit,
  ...frame
}: QuantityFieldProps) {
  const { id, label, error } = frame
  const hasUnit = units.length > 1 || units[0] !== ''
  return (
    <FieldFrame {...frame}>
      <div className={error ? 'quantity quantity-wrong' : 'quantity'}>
        <input
          id={id}
          value={text}
          onChange={(event) => onText(event.target.value)}
          inputMode={negative ? 'text' : 'decimal'}
          autoComplete="off"
          spellCheck={false}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(frame)}
        />
        {uncertain && <PlusMinus fieldId={id} text={text} onText={onText} />}
        {units.length > 1 ? (
          <select
            value={unit}
            onChange={(event) => onUnit(event.target.value)}
            aria-label={`Unit of ${label.toLowerCase()}`}
          >
            {units.map((name) => (
              <option key={name} value={name}>
                {unitWords(name)}
              </option>
            ))}
          </select>
        ) : (
          hasUnit && <span className="quantity-unit">{units[0]}</span>
        )}
      </div>
    </FieldFrame>
  )
}

export function ChoiceField({ value, options, onChoose, ...frame }: ChoiceFieldProps) {
  return (
    <FieldFrame {...frame}>
      <div className={frame.error ? 'quantity quantity-wrong' : 'quantity'}>
        <select
          id={frame.id}
          className="choice"
          value={value}
          onChange={(event) => onChoose(event.target.value)}
          aria-invalid={frame.error ? true : undefined}
          aria-describedby={describedBy(frame)}
        >
          {options.every((option) => option.value !== value) && <option value={value}>{value}</option>}
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.words}
            </option>
          ))}
        </select>
      </div>
    </FieldFrame>
  )
}
