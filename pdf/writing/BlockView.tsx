import { View } from '@react-pdf/renderer'
import type { ReactNode } from 'react'
import type { Block } from '@/lib/writing/tree'
import { Words } from '../parts/Words'
import { colour } from '../theme'
import { Formula } from './Formula'
import { formulaKey } from './formulaShape'
import { Paragraph } from './Paragraph'
import type { Setting } from './setting'

interface BlockProps<B = Block> {
  block: B
  setting: Setting
  base: number
  room: number
}

const gap = 6
const heads = { 1: 1.25, 2: 1.1, 3: 1 } as const

/** One block of a text in print. */
export function BlockView({ block, ...rest }: BlockProps): ReactNode {
  const { setting, base, room } = rest
  switch (block.kind) {
    case 'heading':
      return (
        <View style={{ marginTop: gap * 1.6, marginBottom: gap * 0.6 }} minPresenceAhead={48} wrap={false}>
          <Paragraph
            inlines={block.inlines}
            setting={setting}
            base={base * heads[block.level]}
            room={room}
            bold
          />
        </View>
      )
    case 'paragraph':
      return (
        <View style={{ marginBottom: gap }}>
          <Paragraph inlines={block.inlines} {...rest} />
        </View>
      )
    case 'formula': {
      const shape = setting.shapes.get(formulaKey(block.tex, true))
      return (
        <View wrap={false} style={{ alignItems: 'center', marginTop: gap * 0.4, marginBottom: gap * 1.4 }}>
          {shape ? <Formula shape={shape} base={base} room={room} /> : <Words base={base}>{block.tex}</Words>}
        </View>
      )
    }
    case 'list':
      return <ListView block={block} {...rest} />
    case 'quote':
      return (
        <View style={{ marginBottom: gap, paddingLeft: 12, borderLeft: `1 solid ${colour.rule}` }}>
          {block.blocks.map((inner, index) => (
            <BlockView key={index} block={inner} {...rest} room={room - 12} />
          ))}
        </View>
      )
    case 'code':
      return (
        <View style={{ marginBottom: gap, padding: 6, border: `0.75 solid ${colour.rule}` }}>
          <Words base={base * 0.9}>{block.text}</Words>
        </View>
      )
    case 'table':
      return <TableView block={block} {...rest} />
    case 'rule':
      return <View style={{ marginVertical: gap, borderTop: `0.75 solid ${colour.rule}` }} />
  }
}

function ListView({ block, ...rest }: BlockProps<Extract<Block, { kind: 'list' }>>) {
  const indent = 18
  return (
    <View style={{ marginBottom: gap * 0.4 }}>
      {block.items.map((item, index) => (
        <View key={index} style={{ flexDirection: 'row' }}>
          <Words base={rest.base} style={{ width: indent, lineHeight: 1.5, color: colour.muted }}>
            {block.start === null ? '–' : `${block.start + index}.`}
          </Words>
          <View style={{ width: rest.room - indent }}>
            {item.map((inner, at) => (
              <BlockView key={at} block={inner} {...rest} room={rest.room - indent} />
            ))}
          </View>
        </View>
      ))}
    </View>
  )
}

function TableView({ block, setting, base, room }: BlockProps<Extract<Block, { kind: 'table' }>>) {
  const columns = Math.max(1, ...block.rows.map((row) => row.length))
  const width = room / columns
  return (
    <View style={{ marginBottom: gap * 1.4, borderTop: `1.1 solid ${colour.ink}` }}>
      {block.rows.map((row, index) => (
        <View
          key={index}
          wrap={false}
          style={{
            flexDirection: 'row',
            paddingVertical: 2,
            borderBottom: `0.75 solid ${index === 0 ? colour.edge : colour.rule}`,
          }}
        >
          {row.map((cell, at) => (
            <View key={at} style={{ width, paddingRight: 8 }}>
              <Paragraph
                inlines={cell}
                setting={setting}
                base={base * 0.92}
                room={width - 8}
                bold={index === 0}
                textAlign={block.align[at] ?? 'left'}
              />
            </View>
          ))}
        </View>
      ))}
    </View>
  )
}
