import type { Element, ElementContent, Root } from 'hast'
import { SKIP, visit } from 'unist-util-visit'

const elementsIn = (children: readonly ElementContent[], tagName: string): Element[] =>
  children.filter((child): child is Element => child.type === 'element' && child.tagName === tagName)

/**
 * Leaves of each formula the bare MathML. The wrapper, the name space and the copy of the source serve nothing on the page and would weigh
 * as much as the formula itself.
 */
export const rehypeBareMath = () => (tree: Root) =>
  visit(tree, 'element', (node, index, parent) => {
    const [math] = node.tagName === 'span' ? elementsIn(node.children, 'math') : []
    if (!math || !parent || index === undefined) return
    const [semantics] = elementsIn(math.children, 'semantics')
    if (semantics) math.children = semantics.children.filter((child) => !elementsIn([child], 'annotation').length)
    delete math.properties.xmlns
    parent.children[index] = math
    return SKIP
  })
