import { Document, View } from '@react-pdf/renderer'
import { parseText } from '@/lib/writing/parseText'
import { Brand } from '../parts/Brand'
import { FactRows } from '../parts/FactRows'
import { Sheet } from '../parts/Sheet'
import { Words } from '../parts/Words'
import { colour, size } from '../theme'
import { BlockView } from './BlockView'
import type { FormulaShapes } from './formulaShape'

export interface TeamDocumentProps {
  head: { left: string; right: string }
  label: string
  title: string
  people: readonly { name: string; institute: string; isLead: boolean }[]
  /** Markdown with TeX; empty where a document follows, or nothing was written. */
  text: string
  shapes: FormulaShapes
  /** A document on the team stands on the sheets after this one. */
  isFollowed: boolean
}

const base = 10.2
const room = 452

/** Who asks: names and institutes, and what they wrote of themselves and of time given before. */
export function TeamDocument(props: TeamDocumentProps) {
  const { head, label, title, people, text, shapes, isFollowed } = props
  const setting = { shapes, citations: new Map<string, number>(), figures: new Map<string, number>() }
  return (
    <Document title={label}>
      <Sheet>
        <Brand left={head.left} right={head.right} />
        <View style={{ width: room }}>
          <Words base={9.75} style={{ color: colour.lamp, fontWeight: 600, marginBottom: 3 }}>
            {`${label}, on the team`}
          </Words>
          <Words base={size.title * 0.86} style={{ fontWeight: 600, lineHeight: 1.2, marginBottom: 10 }}>
            {title}
          </Words>
          <FactRows
            rows={people.map(({ name, institute, isLead }) => ({
              term: isLead ? `${name}, leads` : name,
              value: institute,
              bold: isLead,
            }))}
          />
          <View style={{ marginTop: 14 }}>
            {parseText(text).map((block, index) => (
              <BlockView key={index} block={block} setting={setting} base={base} room={room} />
            ))}
            {text === '' && !isFollowed ? (
              <Words base={base} style={{ color: colour.muted }}>
                Nothing was written on the team.
              </Words>
            ) : null}
          </View>
        </View>
      </Sheet>
    </Document>
  )
}
