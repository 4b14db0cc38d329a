import type { ComponentProps } from 'react'

interface HeadingProps extends ComponentProps<'h2'> {
  as: 'h2' | 'h3'
}

/** A heading that is a link to itself, to be copied. */
export function Heading({ as: Tag, id, children, ...rest }: HeadingProps) {
  return (
    <Tag id={id} {...rest}>
      {id === undefined ? (
        children
      ) : (
        <a className="heading-link" href={`#${id}`}>
          {children}
        </a>
      )}
    </Tag>
  )
}
