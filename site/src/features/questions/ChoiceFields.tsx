import { useId } from 'react'

interface ChoiceFieldsProps {
  choices: readonly { id: string; say: string }[]
  chosen: readonly string[]
  choose: (id: string) => void
  /** More than one can be right. */
  several?: boolean
}

export function ChoiceFields({ choices, chosen, choose, several = false }: ChoiceFieldsProps) {
  const name = useId()
  return (
    <div className="choices">
      <p className="quiet">{several ? 'Choose every one that is right.' : 'Choose one.'}</p>
      {choices.map(({ id, say }) => (
        <label key={id}>
          <input
            type={several ? 'checkbox' : 'radio'}
            name={name}
            checked={chosen.includes(id)}
            onChange={() => choose(id)}
          />
          <span>{say}</span>
        </label>
      ))}
    </div>
  )
}
