interface SourceProps {
  author: string
  title: string
  year?: number | string
  where?: string
}

export function Source({ author, title, year, where }: SourceProps) {
  return (
    <p className="source">
      Source: {author}, <cite>{title}</cite>
      {year !== undefined && ` (${year})`}
      {where && `, ${where}`}
    </p>
  )
}
