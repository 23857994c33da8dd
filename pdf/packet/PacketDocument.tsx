import { Document, View } from '@react-pdf/renderer'
import { Brand } from '../parts/Brand'
import { FactRows } from '../parts/FactRows'
import { Heading } from '../parts/Heading'
import { Sheet } from '../parts/Sheet'
import { Verdict } from '../parts/Verdict'
import { Words } from '../parts/Words'
import { colour, size } from '../theme'
import type { PacketData } from './packetTypes'
import { SpectrumChart } from './SpectrumChart'
import { RuleLines } from './RuleLines'
import { TargetsTable } from './TargetsTable'
import { UpChart } from './UpChart'

/** The pages of a packet made by us: what is asked, of what, when it is up, and what is not clear. */
export function PacketDocument({ data }: { data: PacketData }) {
  return (
    <Document title={data.label}>
      <Sheet>
        <Brand left={data.observatory} right={data.season} />
        <View style={{ flexDirection: 'row', gap: 30 }}>
          <View style={{ width: 338 }}>
            <Words base={9.75} style={{ color: colour.lamp, fontWeight: 600, marginBottom: 3 }}>
              {data.label}
            </Words>
            <Words base={size.title} style={{ fontWeight: 600, lineHeight: 1.2, marginBottom: 7 }}>
              {data.title || 'Without a title'}
            </Words>
            {data.people.length > 0 ? (
              <View style={{ marginBottom: 7 }}>
                {data.people.map(({ name, institute }) => (
                  <Words key={`${name} ${institute}`} base={size.text} style={{ lineHeight: 1.4 }}>
                    {institute ? `${name}, ${institute}` : name}
                  </Words>
                ))}
              </View>
            ) : null}
            <Words base={size.text} style={{ lineHeight: size.textLeading }}>
              {data.abstract}
            </Words>
            <Words base={size.text} style={{ color: colour.muted, marginTop: 7 }}>
              {`Category: ${data.category}`}
            </Words>
          </View>
          <View style={{ flexGrow: 1 }}>
            <FactRows rows={data.facts} />
          </View>
        </View>
        <Heading>Targets and hours</Heading>
        <TargetsTable data={data} />
        <RuleLines rules={data.rules} />
        <Words base={8.6} style={{ color: colour.muted, marginTop: 7, lineHeight: 1.4 }}>
          {data.cosmology}
        </Words>
        {data.carried.map((line) => (
          <Words key={line} base={8.6} style={{ color: colour.muted, marginTop: 3, lineHeight: 1.4 }}>
            {line}
          </Words>
        ))}
        {data.up ? (
          <View>
            <Heading>When the targets are up</Heading>
            <Words base={8.6} style={{ color: colour.muted, marginBottom: 6 }}>
              {data.up.note}
            </Words>
            <UpChart up={data.up} />
          </View>
        ) : null}
        {data.spectra.map((spectrum) => (
          <SpectrumChart key={spectrum.modeName} spectrum={spectrum} />
        ))}
        {data.notes.map((note, index) => (
          <View
            key={index}
            wrap={false}
            style={{ marginTop: 10, paddingLeft: 9, borderLeft: `2.6 solid ${colour[note.verdict]}` }}
          >
            <View style={{ marginBottom: 2 }}>
              <Verdict verdict={note.verdict} label={note.words} bold />
            </View>
            <Words base={size.text} style={{ lineHeight: 1.4 }}>
              {note.text}
            </Words>
          </View>
        ))}
      </Sheet>
    </Document>
  )
}
