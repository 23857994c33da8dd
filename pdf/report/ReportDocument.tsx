import { Document, View } from '@react-pdf/renderer'
import { Brand } from '../parts/Brand'
import { FactRows } from '../parts/FactRows'
import { Sheet } from '../parts/Sheet'
import { Words } from '../parts/Words'
import { colour, size } from '../theme'
import { ReportTable } from './ReportTable'
import type { ReportData, ReportSection } from './reportTypes'
import { RunningFoot } from './RunningFoot'

/** The renderer takes bookmarks on any box; its types know them of pages alone. */
const bookmark = (title: string): object => ({ bookmark: title })

/** A heading stands on one page with its sentence and some of what follows, and is a bookmark of the file. */
function Section({ section }: { section: ReportSection }) {
  return (
    <>
      <View
        {...bookmark(section.heading)}
        wrap={false}
        minPresenceAhead={section.table ? 70 : 40}
        style={{ marginTop: 17 }}
      >
        <Words base={size.section} style={{ fontWeight: 600, marginBottom: 5 }}>
          {section.heading}
        </Words>
        {section.note ? (
          <Words base={size.text} style={{ lineHeight: 1.4, marginBottom: 7 }}>
            {section.note}
          </Words>
        ) : null}
        {section.facts ? <FactRows rows={section.facts} /> : null}
      </View>
      {section.table ? (
        <View style={{ marginTop: section.facts ? 10 : 0 }}>
          <ReportTable {...section.table} />
        </View>
      ) : null}
      {section.lines?.map((line, index) => (
        <Words key={index} base={size.text} style={{ lineHeight: 1.4, marginTop: 5 }}>
          {line}
        </Words>
      ))}
    </>
  )
}

/** What a panel did and recommends, for its chair and the office. */
export function ReportDocument({ data }: { data: ReportData }) {
  return (
    <Document
      title={`${data.label}, ${data.title}`}
      language="en-GB"
      creator="Noctuary"
      producer="Noctuary"
      pageMode="useOutlines"
    >
      <Sheet>
        <Brand left={data.observatory} right={data.season} />
        <Words base={9.75} style={{ color: colour.lamp, fontWeight: 600, marginBottom: 3 }}>
          {data.label}
        </Words>
        <Words base={size.title} style={{ fontWeight: 600, lineHeight: 1.2, marginBottom: 7 }}>
          {data.title}
        </Words>
        <Words base={size.text} style={{ lineHeight: size.textLeading }}>
          {data.sentence}
        </Words>
        {data.sections.map((section) => (
          <Section key={section.heading} section={section} />
        ))}
        <RunningFoot {...data.footer} />
      </Sheet>
    </Document>
  )
}
