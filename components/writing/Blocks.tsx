import { Fragment, type ReactNode } from 'react'
import type { Block } from '@/lib/writing/tree'
import { Formula } from './Formula'
import { Inlines } from './Inlines'
import type { ReadAs } from './readAs'

export interface BlocksProps {
  blocks: readonly Block[]
  as: ReadAs
}

const headings = { 1: 'h3', 2: 'h4', 3: 'h5' } as const
const sides = { left: undefined, right: 'to-right', center: 'to-centre' } as const

function one(block: Block, as: ReadAs): ReactNode {
  switch (block.kind) {
    case 'heading': {
      const Heading = headings[block.level]
      return (
        <Heading>
          <Inlines inlines={block.inlines} as={as} />
        </Heading>
      )
    }
    case 'paragraph':
      return (
        <p>
          <Inlines inlines={block.inlines} as={as} />
        </p>
      )
    case 'formula':
      return (
        // A wide formula is scrolled by itself, also from the keyboard.
        <div className="written-formula" tabIndex={0} role="group" aria-label="Formula">
          <Formula tex={block.tex} display />
        </div>
      )
    case 'list': {
      const items = block.items.map((item, index) => (
        <li key={index}>
          <Blocks blocks={item} as={as} />
        </li>
      ))
      return block.start === null ? <ul>{items}</ul> : <ol start={block.start}>{items}</ol>
    }
    case 'quote':
      return (
        <blockquote>
          <Blocks blocks={block.blocks} as={as} />
        </blockquote>
      )
    case 'code':
      return (
        <pre tabIndex={0}>
          <code>{block.text}</code>
        </pre>
      )
    case 'table':
      return <Table block={block} as={as} />
    case 'rule':
      return <hr />
  }
}

function Table({ block, as }: { block: Extract<Block, { kind: 'table' }>; as: ReadAs }) {
  const [head = [], ...rows] = block.rows
  const side = (at: number) => sides[block.align[at] ?? 'left']
  return (
    <table>
      <thead>
        <tr>
          {head.map((cell, at) => (
            <th key={at} scope="col" className={side(at)}>
              <Inlines inlines={cell} as={as} />
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row, index) => (
          <tr key={index}>
            {row.map((cell, at) => (
              <td key={at} className={side(at)}>
                <Inlines inlines={cell} as={as} />
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  )
}

/** Blocks of a text as they will be read. */
export function Blocks({ blocks, as }: BlocksProps) {
  return blocks.map((block, index) => <Fragment key={index}>{one(block, as)}</Fragment>)
}
