import { Text, View } from '@react-pdf/renderer'
import { Words } from '../parts/Words'
import { colour, size } from '../theme'

/** The foot of every page: for whom it is, and which page of how many. */
export function RunningFoot({ left, right }: { left: string; right: string }) {
  return (
    <View
      fixed
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
        {left}
      </Words>
      <Text
        style={{ fontSize: size.footer, color: colour.muted }}
        render={({ pageNumber, totalPages }) => `${right}, page ${pageNumber} of ${totalPages}`}
      />
    </View>
  )
}
