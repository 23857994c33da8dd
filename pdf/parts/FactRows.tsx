import { View } from '@react-pdf/renderer'
import { colour, size } from '../theme'
import { Words } from './Words'

export interface FactRow {
  term: string
  value: string
  bold?: boolean
}

/** Definition rows: the term muted at the left, its value at the right, an ink line above. */
export function FactRows({ rows }: { rows: readonly FactRow[] }) {
  return (
    <View style={{ borderTop: `1.1 solid ${colour.ink}` }}>
      {rows.map(({ term, value, bold }) => (
        <View
          key={term}
          wrap={false}
          style={{
            flexDirection: 'row',
            justifyContent: 'space-between',
            gap: 10,
            paddingTop: 4.5,
            paddingBottom: 4,
            borderBottom: `0.75 solid ${colour.rule}`,
          }}
        >
          <Words base={size.text} style={{ color: colour.muted }}>
            {term}
          </Words>
          <Words base={size.text} style={{ flexShrink: 1, textAlign: 'right', fontWeight: bold ? 600 : 400 }}>
            {value}
          </Words>
        </View>
      ))}
    </View>
  )
}
