import { Document, View } from '@react-pdf/renderer'
import { Brand } from '../parts/Brand'
import { FactRows, type FactRow } from '../parts/FactRows'
import { Sheet } from '../parts/Sheet'
import { Words } from '../parts/Words'
import { colour, size } from '../theme'

export interface BillData {
  observatory: string
  kind: 'Invoice' | 'Credit note'
  number: string
  /** Lines of the address, the institute first. */
  to: readonly string[]
  facts: readonly FactRow[]
  /** What the amount is for. */
  line: string
  amount: string
  vat: string
  /** The account it is paid to; none on a credit note. */
  pay: readonly FactRow[]
  closing: readonly string[]
}

/** An invoice or a credit note on one sheet: who it is for, what it is for, and the sum under a double line. */
export function BillDocument({ data }: { data: BillData }) {
  return (
    <Document title={`${data.kind} ${data.number}`} language="en-GB" creator="Noctuary" producer="Noctuary">
      <Sheet>
        <Brand left={data.observatory} right={data.kind} />
        <View style={{ flexDirection: 'row', gap: 32, marginTop: 6, marginBottom: 26 }}>
          <View style={{ flexGrow: 1, flexBasis: 0 }}>
            {data.to.map((words, index) => (
              <Words key={index} base={11} style={{ lineHeight: 1.45, fontWeight: index === 0 ? 600 : 400 }}>
                {words}
              </Words>
            ))}
          </View>
          <View style={{ width: 220 }}>
            <FactRows rows={data.facts} />
          </View>
        </View>
        <Words base={size.title} style={{ fontWeight: 600, marginBottom: 14 }}>
          {`${data.kind} ${data.number}`}
        </Words>
        <FactRows
          rows={[
            { term: data.line, value: data.amount },
            { term: 'VAT, none is charged', value: data.vat },
          ]}
        />
        <Total amount={data.amount} />
        {data.pay.length > 0 ? (
          <View style={{ width: 330, marginTop: 26 }}>
            <Words base={size.section} style={{ fontWeight: 600, marginBottom: 8 }}>
              Pay to
            </Words>
            <FactRows rows={data.pay} />
          </View>
        ) : null}
        {data.closing.map((words) => (
          <Words key={words} base={size.text} style={{ marginTop: 14, lineHeight: size.textLeading }}>
            {words}
          </Words>
        ))}
      </Sheet>
    </Document>
  )
}

function Total({ amount }: { amount: string }) {
  return (
    <View
      style={{
        borderTop: `1.1 solid ${colour.ink}`,
        borderBottom: `1 solid ${colour.ink}`,
        paddingBottom: 2,
      }}
    >
      <View
        style={{
          flexDirection: 'row',
          justifyContent: 'space-between',
          paddingTop: 5,
          paddingBottom: 4,
          borderBottom: `1 solid ${colour.ink}`,
        }}
      >
        <Words base={size.text} style={{ fontWeight: 600 }}>
          In all
        </Words>
        <Words base={size.text} style={{ fontWeight: 600 }}>
          {amount}
        </Words>
      </View>
    </View>
  )
}
