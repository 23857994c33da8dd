import { Fragment, type ReactNode } from 'react'
import { TextLink } from '@/components/ui/TextLink'
import { citationMark } from '@/lib/writing/citations'
import type { Inline } from '@/lib/writing/tree'
import { Formula } from './Formula'
import type { ReadAs } from './readAs'

export interface InlinesProps {
  inlines: readonly Inline[]
  as: ReadAs
}

function one(inline: Inline, as: ReadAs): ReactNode {
  switch (inline.kind) {
    case 'text':
      return inline.text
    case 'strong':
      return (
        <strong className="font-semibold">
          <Inlines inlines={inline.inlines} as={as} />
        </strong>
      )
    case 'emphasis':
      return (
        <em>
          <Inlines inlines={inline.inlines} as={as} />
        </em>
      )
    case 'code':
      return <code>{inline.text}</code>
    case 'formula':
      return <Formula tex={inline.tex} display={false} />
    case 'link':
      return (
        <TextLink href={inline.href}>
          <Inlines inlines={inline.inlines} as={as} />
        </TextLink>
      )
    case 'cite':
      return citationMark(inline.keys, as.citations)
    case 'figure': {
      const number = as.figures.get(inline.label)
      return number ? `Figure\u00a0${number}` : `[@fig:${inline.label}]`
    }
    case 'break':
      return <br />
  }
}

/** Words of a paragraph as they will be read. */
export function Inlines({ inlines, as }: InlinesProps) {
  return inlines.map((inline, index) => <Fragment key={index}>{one(inline, as)}</Fragment>)
}
