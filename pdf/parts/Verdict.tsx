import { Path, Svg, View } from '@react-pdf/renderer'
import { colour, size } from '../theme'
import { Words } from './Words'

export type PrintedVerdict = 'feasible' | 'marginal' | 'not-feasible'

const reach = { feasible: 6, marginal: 12, 'not-feasible': 16 } as const
const words = { feasible: 'feasible', marginal: 'marginal', 'not-feasible': 'not feasible' } as const

interface VerdictProps {
  verdict: PrintedVerdict
  /** Stands for the usual word. */
  label?: string
  bold?: boolean
}

/** The bar against its limit, with its word. */
export function Verdict({ verdict, label, bold = false }: VerdictProps) {
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center', gap: 5 }}>
      <Svg width={10.6} height={8} viewBox="0 0 16 12">
        <Path d={`M9 0H10.5V12H9ZM0 4H${reach[verdict]}V8H0Z`} fill={colour[verdict]} />
      </Svg>
      <Words base={label ? size.text : 8} style={{ color: colour[verdict], fontWeight: bold ? 600 : 400 }}>
        {label ?? words[verdict]}
      </Words>
    </View>
  )
}
