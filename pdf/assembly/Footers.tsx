import { Document, View } from '@react-pdf/renderer'
import { Sheet } from '../parts/Sheet'
import { Words } from '../parts/Words'
import { colour, size } from '../theme'

export interface FooterWords {
  left: string
  middle: string
  /** Before the page number: `14-083`. */
  right: string
}

/** One sheet a page with nothing but its footer, to be laid over the pages of a packet. */
export function Footers({ pages, words }: { pages: number; words: FooterWords }) {
  return (
    <Document>
      {Array.from({ length: pages }, (_, index) => (
        <Sheet key={index}>
          <View
            style={{
              position: 'absolute',
              left: size.margin,
              right: size.margin,
              bottom: 28,
              paddingTop: 9,
              borderTop: `0.75 solid ${colour.rule}`,
              flexDirection: 'row',
              justifyContent: 'space-between',
            }}
          >
            <Words base={size.footer} style={{ color: colour.muted }}>
              {words.left}
            </Words>
            <Words base={size.footer} style={{ color: colour.muted }}>
              {words.middle}
            </Words>
            <Words base={size.footer} style={{ color: colour.muted }}>
              {`${words.right}, page ${index + 1} of ${pages}`}
            </Words>
          </View>
        </Sheet>
      ))}
    </Document>
  )
}
