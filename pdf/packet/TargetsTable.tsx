import { View } from '@react-pdf/renderer'
import { Verdict } from '../parts/Verdict'
import { Words } from '../parts/Words'
import { colour, size } from '../theme'
import type { PacketData, PacketRow } from './packetTypes'

interface Column {
  key: Exclude<keyof PacketRow, 'verdict'>
  head: string
  unit: string
  width: number
  align: 'left' | 'right'
  bold?: boolean
}

function columnsOf({ magnitudeHead }: PacketData): Column[] {
  return [
    { key: 'number', head: '', unit: '', width: 11, align: 'left' },
    { key: 'name', head: 'Name', unit: '', width: 76, align: 'left', bold: true },
    { key: 'position', head: 'Position', unit: 'ICRS', width: 101, align: 'left' },
    { key: 'redshift', head: 'z', unit: '', width: 28, align: 'right' },
    { key: 'magnitude', head: magnitudeHead.head, unit: magnitudeHead.unit, width: 27, align: 'right' },
    { key: 'luminosityMpc', head: 'D(L)', unit: 'Mpc', width: 44, align: 'right' },
    { key: 'kpcPerArcsec', head: 'scale', unit: 'kpc/″', width: 31, align: 'right' },
    { key: 'feature', head: 'feature', unit: 'Å, observed', width: 60, align: 'right' },
    { key: 'needed', head: 'needed', unit: 'h', width: 36, align: 'right' },
    { key: 'asked', head: 'asked', unit: 'h', width: 28, align: 'right' },
  ]
}

const cell = 8

function Head({ columns }: { columns: readonly Column[] }) {
  return (
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
      {columns.map((column) => (
        <View key={column.key} style={{ width: column.width, flexShrink: 0 }}>
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
      <View style={{ flexGrow: 1, paddingLeft: 7 }}>
        <Words base={cell} style={{ fontWeight: 600 }}>
          verdict
        </Words>
      </View>
    </View>
  )
}

/** Targets with their computed columns, observation by observation, and the total. */
export function TargetsTable({ data }: { data: PacketData }) {
  const columns = columnsOf(data)
  const { total } = data
  return (
    <View>
      <Head columns={columns} />
      {data.rows.map((row, index) => (
        <View
          key={index}
          wrap={false}
          style={{ flexDirection: 'row', paddingVertical: 4.6, borderBottom: `0.75 solid ${colour.rule}` }}
        >
          {columns.map(({ key, width, align, bold }) => (
            <Words
              key={key}
              base={cell}
              style={{
                width,
                flexShrink: 0,
                textAlign: align,
                fontWeight: bold ? 600 : 400,
              }}
            >
              {row[key]}
            </Words>
          ))}
          <View style={{ flexGrow: 1, paddingLeft: 7 }}>
            {row.verdict ? <Verdict verdict={row.verdict} /> : null}
          </View>
        </View>
      ))}
      <View
        wrap={false}
        style={{
          flexDirection: 'row',
          paddingVertical: 5,
          borderTop: `1.1 solid ${colour.ink}`,
          borderBottom: `1 solid ${colour.ink}`,
        }}
      >
        <Words base={cell} style={{ width: 378, paddingLeft: 11, fontWeight: 600 }}>
          {total.words}
        </Words>
        <Words base={cell} style={{ width: 36, textAlign: 'right', fontWeight: 600 }}>
          {total.needed}
        </Words>
        <Words base={cell} style={{ width: 28, textAlign: 'right', fontWeight: 600 }}>
          {total.asked}
        </Words>
        <View style={{ flexGrow: 1, paddingLeft: 7 }}>
          {total.verdict ? <Verdict verdict={total.verdict} bold /> : null}
        </View>
      </View>
      <View style={{ height: 2.2, borderBottom: `1 solid ${colour.ink}` }} />
    </View>
  )
}
