import { View } from '@react-pdf/renderer'
import { Verdict } from '../parts/Verdict'
import { Words } from '../parts/Words'
import { colour } from '../theme'
import type { PacketData } from './packetTypes'

/** Under the table of targets: a line for each group, for what is awaited and for what its marks mean. */
export function RuleLines({ rules }: Pick<PacketData, 'rules'>) {
  return rules.map(({ name, text, verdict }) => (
    <View key={`${name} ${text}`} wrap={false} style={{ marginTop: 6 }}>
      {name ? (
        <View style={{ flexDirection: 'row', alignItems: 'center', gap: 7 }}>
          <Words base={8.6} style={{ fontWeight: 600 }}>
            {name}
          </Words>
          {verdict ? <Verdict verdict={verdict} /> : null}
        </View>
      ) : null}
      <Words base={8.6} style={{ lineHeight: 1.4, color: name ? colour.ink : colour.muted }}>
        {text}
      </Words>
    </View>
  ))
}
