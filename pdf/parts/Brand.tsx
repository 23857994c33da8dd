import { Circle, Path, Svg, View } from '@react-pdf/renderer'
import { colour } from '../theme'
import { Words } from './Words'

/** Head of a document: the mark and what it belongs to at the left, a date at the right, a double ink line below. */
export function Brand({ left, right }: { left: string; right: string }) {
  return (
    <View fixed style={{ marginBottom: 20 }}>
      <View style={{ flexDirection: 'row', justifyContent: 'space-between', alignItems: 'center' }}>
        <View style={{ flexDirection: 'row', alignItems: 'center', gap: 7 }}>
          <Svg width={16} height={12} viewBox="0 0 24 18">
            <Path d="M3.5 12A8.5 8.5 0 0 1 16 4.6" stroke={colour.ink} strokeWidth={1.6} fill="none" />
            <Path d="M20.5 12H3.5M7 16.4H17" stroke={colour.ink} strokeWidth={1.6} fill="none" />
            <Path d="M20.5 12A8.5 8.5 0 0 0 19.6 8.2" stroke={colour.ink} strokeWidth={1.6} fill="none" />
            <Circle cx={17.6} cy={5.2} r={1.9} fill={colour.lamp} />
          </Svg>
          <Words base={10.5} style={{ fontWeight: 600 }}>
            {left}
          </Words>
        </View>
        <Words base={9.75}>{right}</Words>
      </View>
      <View
        style={{
          marginTop: 9,
          height: 3,
          borderTop: `1 solid ${colour.ink}`,
          borderBottom: `1 solid ${colour.ink}`,
        }}
      />
    </View>
  )
}
