import { Document, Image as Raster, View } from '@react-pdf/renderer'
import { citationsOf } from '@/lib/writing/citations'
import { parseText } from '@/lib/writing/parseText'
import { placeFigures } from '@/lib/writing/placeFigures'
import { referenceLine } from '@/lib/writing/referenceLine'
import { Brand } from '../parts/Brand'
import { Sheet } from '../parts/Sheet'
import { Words } from '../parts/Words'
import { colour, size } from '../theme'
import { BlockView } from './BlockView'
import type { FormulaShapes } from './formulaShape'
import { Paragraph } from './Paragraph'
import type { Setting } from './setting'
import type { PrintedFigure, WrittenData } from './writtenData'

export interface WrittenDocumentProps {
  /** At the head of each sheet. */
  head: { left: string; right: string }
  title: string
  written: WrittenData
  shapes: FormulaShapes
  /** Bytes of the figures by fingerprint; one that is missing leaves its caption alone. */
  pictures: ReadonlyMap<string, Buffer>
}

const base = 10.2
const room = 452
const tallest = 330
/** The coarsest a picture is printed, dots an inch. */
const coarsest = 110

/** A text written here, in print: paragraphs, formulas, figures after the paragraph that names them, references. */
export function WrittenDocument({ head, title, written, shapes, pictures }: WrittenDocumentProps) {
  const tree = parseText(written.text)
  const { numbers, cited } = citationsOf(tree, written.references)
  const figures = new Map(written.figures.map(({ label }, index) => [label, index + 1]))
  const setting: Setting = { shapes, citations: numbers, figures }
  return (
    <Document title={title}>
      <Sheet>
        <Brand left={head.left} right={head.right} />
        <View style={{ width: room }}>
          <Words base={size.title * 0.86} style={{ fontWeight: 600, marginBottom: 8 }}>
            {title}
          </Words>
          {placeFigures(tree, written.figures).map((placed, index) =>
            placed.kind === 'block' ? (
              <BlockView key={index} block={placed.block} setting={setting} base={base} room={room} />
            ) : (
              <Picture key={index} {...placed} setting={setting} bytes={pictures.get(placed.figure.sha256)} />
            ),
          )}
          {cited.length > 0 ? (
            <View style={{ marginTop: 8 }}>
              <Words base={base * 1.1} style={{ fontWeight: 600, marginBottom: 4 }}>
                References
              </Words>
              {cited.map((reference, index) => (
                <View key={reference.key} wrap={false} style={{ flexDirection: 'row', marginBottom: 2 }}>
                  <Words base={8.6} style={{ width: 22, lineHeight: 1.4, color: colour.muted }}>
                    {`[${index + 1}]`}
                  </Words>
                  <Words base={8.6} style={{ width: room - 22, lineHeight: 1.4 }}>
                    {referenceLine(reference)}
                  </Words>
                </View>
              ))}
            </View>
          ) : null}
        </View>
      </Sheet>
    </Document>
  )
}

interface PictureProps {
  figure: PrintedFigure
  number: number
  setting: Setting
  bytes: Buffer | undefined
}

function Picture({ figure, number, setting, bytes }: PictureProps) {
  const natural = (figure.widthPx * 72) / coarsest
  const width = Math.min(room, natural, (tallest * figure.widthPx) / figure.heightPx)
  return (
    <View wrap={false} style={{ marginTop: 6, marginBottom: 12 }}>
      {bytes ? (
        <Raster
          src={bytes}
          style={{ width, height: (width * figure.heightPx) / figure.widthPx, marginBottom: 5 }}
        />
      ) : null}
      <Paragraph
        inlines={[
          { kind: 'strong', inlines: [{ kind: 'text', text: `Figure ${number}. ` }] },
          ...parseText(figure.caption).flatMap((block) => ('inlines' in block ? block.inlines : [])),
        ]}
        setting={setting}
        base={8.8}
        room={room}
      />
    </View>
  )
}
