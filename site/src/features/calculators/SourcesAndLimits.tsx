import type { CalculatorDefinition } from '#calc/index.ts'

/** What a calculator leaves unchecked, and where its formulas come from. */
export function SourcesAndLimits({
  definition: { doesNotCheck, sources },
  level: Heading,
}: {
  definition: CalculatorDefinition
  level: 'h2' | 'h3' | 'h4' | 'h5'
}) {
  return (
    <div className="sources-and-limits">
      {doesNotCheck.length > 0 && (
        <div>
          <Heading className="calculator-subheading">What this does not check</Heading>
          <ul>
            {doesNotCheck.map((text) => (
              <li key={text}>{text}</li>
            ))}
          </ul>
        </div>
      )}
      {sources.length > 0 && (
        <div>
          <Heading className="calculator-subheading">Sources</Heading>
          <ul>
            {sources.map(({ author, title, year, where }) => (
              <li key={`${author} ${title}`}>
                {author}, <cite>{title}</cite> ({year}){where && `, ${where}`}
              </li>
            ))}
          </ul>
        </div>
      )}
    </div>
  )
}
