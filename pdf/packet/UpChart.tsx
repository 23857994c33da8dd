import { Line, Path, Svg, View } from '@react-pdf/renderer'
import { upBar } from '@/components/charts/geometry/upBar'
import { Words } from '../parts/Words'
import { colour, size } from '../theme'
import type { UpChartData } from './packetTypes'

const nameWidth = 82
const plotWidth = 372
const rowHeight = 18
const inks = {
  plain: colour.accent,
  marginal: colour.marginal,
  'not-feasible': colour['not-feasible'],
} as const

/** When the targets are up: hours a night, a row each, months below and Moons above. */
export function UpChart({ up }: { up: UpChartData }) {
  const x = (night: number) => (plotWidth * night) / Math.max(1, up.nights - 1)
  const label = { position: 'absolute', width: 40, textAlign: 'center' } as const
  return (
    <View>
      <View style={{ marginLeft: nameWidth + 6, height: 12, width: plotWidth }}>
        {up.moons.map(({ night, words }) => (
          <Words
            key={night}
            base={size.unit}
            style={{
              ...label,
              left: x(night) - 20,
              color: colour.muted,
              fontWeight: words === 'full' ? 600 : 400,
            }}
          >
            {words}
          </Words>
        ))}
      </View>
      {up.rows.map((row) => {
        const shape = upBar(row.byNight, plotWidth, rowHeight - 2, up.maxHours)
        return (
          <View
            key={row.name}
            wrap={false}
            style={{ flexDirection: 'row', alignItems: 'flex-end', height: rowHeight }}
          >
            <Words base={8} style={{ width: nameWidth, textAlign: 'right', marginRight: 6, marginBottom: 2 }}>
              {row.name}
            </Words>
            <Svg width={plotWidth} height={rowHeight - 2} viewBox={`0 0 ${plotWidth} ${rowHeight - 2}`}>
              {up.months.slice(1).map(({ night }) => (
                <Line
                  key={night}
                  x1={x(night)}
                  x2={x(night)}
                  y1={0}
                  y2={rowHeight}
                  stroke={colour.grid}
                  strokeWidth={0.75}
                />
              ))}
              <Path d={shape.area} fill={inks[row.tone]} fillOpacity={0.16} />
              <Path d={shape.line} stroke={inks[row.tone]} strokeWidth={1} fill="none" />
            </Svg>
            <Words base={8} style={{ width: 51, textAlign: 'right', marginBottom: 2 }}>
              {row.total}
            </Words>
          </View>
        )
      })}
      <View
        style={{
          marginLeft: nameWidth + 6,
          height: 18,
          width: plotWidth,
          borderTop: `0.75 solid ${colour.rule}`,
        }}
      >
        {up.months.map(({ night, name }, index) => {
          const end = up.months[index + 1]?.night ?? up.nights - 1
          return (
            <Words
              key={night}
              base={size.unit}
              style={{
                position: 'absolute',
                top: 3,
                left: x(night),
                width: x(end) - x(night),
                textAlign: 'center',
                color: colour.muted,
              }}
            >
              {name}
            </Words>
          )
        })}
      </View>
    </View>
  )
}
