import { useId } from 'react'

interface Thing {
  id: string
  say: string
}

interface MatchFieldsProps {
  left: readonly Thing[]
  right: readonly Thing[]
  pairs: Readonly<Record<string, string>>
  write: (pairs: Record<string, string>) => void
}

const letter = (i: number) => String.fromCharCode('A'.charCodeAt(0) + i)

/** Each thing on the left gets one from the list. The list is written out too, since a long choice is hard to read in a field. */
export function MatchFields({ left, right, pairs, write }: MatchFieldsProps) {
  const id = useId()
  return (
    <>
      <ol className="match-choices" aria-label="To choose from">
        {right.map(({ id, say }) => (
          <li key={id}>{say}</li>
        ))}
      </ol>
      <div className="match">
        {left.map((thing) => (
          <div key={thing.id}>
            <label htmlFor={`${id}${thing.id}`}>{thing.say}</label>
            <select
              id={`${id}${thing.id}`}
              value={pairs[thing.id] ?? ''}
              onChange={(event) => write({ ...pairs, [thing.id]: event.target.value })}
            >
              <option value="" disabled>
                Choose
              </option>
              {right.map(({ id, say }, i) => (
                <option key={id} value={id}>
                  {letter(i)} · {say}
                </option>
              ))}
            </select>
          </div>
        ))}
      </div>
    </>
  )
}
