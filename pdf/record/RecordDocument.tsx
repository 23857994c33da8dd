import { Document, View } from '@react-pdf/renderer'
import { Brand } from '../parts/Brand'
import { FactRows, type FactRow } from '../parts/FactRows'
import { Sheet } from '../parts/Sheet'
import { Words } from '../parts/Words'
import { colour, size } from '../theme'

export interface RecordData {
  observatory: string
  /** Small line above: what this paper is. */
  kind: string
  /** Large: the reference or the number of a receipt. */
  head: string
  sentence: string
  facts: readonly FactRow[]
  /** Further lists, each under its heading. */
  lists: readonly { heading: string; rows: readonly FactRow[] }[]
  closing: string
}

/** One sheet that proves something to whoever keeps it: that a proposal arrived, or that its fee was paid. */
export function RecordDocument({ data }: { data: RecordData }) {
  return (
    <Document title={`${data.kind} ${data.head}`} language="en-GB" creator="Noctuary" producer="Noctuary">
      <Sheet>
        <Brand left={data.observatory} right={data.kind} />
        <Words base={36} style={{ fontWeight: 600, marginTop: 10, marginBottom: 8 }}>
          {data.head}
        </Words>
        <Words base={11} style={{ lineHeight: 1.5, marginBottom: 18 }}>
          {data.sentence}
        </Words>
        <FactRows rows={data.facts} />
        {data.lists.map(({ heading, rows }) => (
          <View key={heading} style={{ marginTop: 20 }}>
            <Words base={size.section} style={{ fontWeight: 600, marginBottom: 6 }}>
              {heading}
            </Words>
            <FactRows rows={rows} />
          </View>
        ))}
        <Words base={8.6} style={{ color: colour.muted, marginTop: 18, lineHeight: 1.4 }}>
          {data.closing}
        </Words>
      </Sheet>
    </Document>
  )
}
