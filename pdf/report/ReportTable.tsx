import { View } from '@react-pdf/renderer'
import { Words } from '../parts/Words'
import { colour, size } from '../theme'
import type { ReportColumn, ReportSection } from './reportTypes'

const cell = 8
const gap = 6

/** Room stands at the right of every column but the last, which ends with the page. */
const box = ({ width }: ReportColumn, isLast: boolean) => ({
  width,
  flexShrink: 0,
  paddingRight: isLast ? 0 : gap,
})

/** A table of words: its head repeated on every page it runs over, no row cut in two. */
export function ReportTable({ columns, rows }: NonNullable<ReportSection['table']>) {
  return (
    <View>
      <View
        fixed
        style={{
          flexDirection: 'row',
          alignItems: 'flex-end',
          borderTop: `1.1 solid ${colour.ink}`,
          borderBottom: `0.75 solid ${colour.edge}`,
          paddingVertical: 4,
        }}
      >
        {columns.map((column, at) => (
          <View key={column.head} style={box(column, at === columns.length - 1)}>
            <Words base={cell} style={{ textAlign: column.align, fontWeight: 600 }}>
              {column.head}
            </Words>
            {column.unit ? (
              <Words base={size.unit} style={{ textAlign: column.align, color: colour.muted }}>
                {column.unit}
              </Words>
            ) : null}
          </View>
        ))}
      </View>
      {rows.map((row, index) => (
        <View
          key={index}
          wrap={false}
          style={{ flexDirection: 'row', paddingVertical: 4.2, borderBottom: `0.75 solid ${colour.rule}` }}
        >
          {columns.map((column, at) => (
            <View key={column.head} style={box(column, at === columns.length - 1)}>
              <Words
                base={cell}
                style={{ textAlign: column.align, fontWeight: column.bold ? 600 : 400, lineHeight: 1.3 }}
              >
                {row[at] ?? ''}
              </Words>
            </View>
          ))}
        </View>
      ))}
    </View>
  )
}
