import { Line, Path, Rect, Svg, View } from '@react-pdf/renderer'
import { spectrumStrip } from '@/components/charts/geometry/spectrumStrip'
import { formatNumber } from '@/lib/format'
import { Heading } from '../parts/Heading'
import { Words } from '../parts/Words'
import { colour, size } from '../theme'
import type { SpectrumChartData, SpectrumRow } from './packetTypes'

const nameWidth = 82
const plotWidth = 423
const rowHeight = 25
const skyHeight = 12

type Scale = (at: number) => number

/** A word centred on a place, kept on the plot. */
const centred = (x: number, width: number) => ({
  position: 'absolute' as const,
  width,
  left: Math.min(plotWidth - width, Math.max(0, x - width / 2)),
  textAlign: 'center' as const,
})

/** Bands whose names do not touch the one before. */
function apart(bands: SpectrumChartData['bands'], x: Scale): SpectrumChartData['bands'] {
  const kept: SpectrumChartData['bands'][number][] = []
  const middle = (band: SpectrumChartData['bands'][number]) => x((band.fromA + band.toA) / 2)
  for (const band of bands) {
    const last = kept.at(-1)
    if (!last || middle(band) - middle(last) >= 26) kept.push(band)
  }
  return kept
}

/** What lies behind every row: where the mode does not see, and the bands of the air, the heavy ones darker. */
function Behind({ spectrum, x, height }: { spectrum: SpectrumChartData; x: Scale; height: number }) {
  const { mode, bands } = spectrum
  return (
    <>
      {bands.map((band) => (
        <Rect
          key={band.fromA}
          x={x(band.fromA)}
          y={0}
          width={x(band.toA) - x(band.fromA)}
          height={height}
          fill={band.isHeavy ? colour.rule : colour.grid}
        />
      ))}
      {[mode.fromA, mode.toA].map((at) => (
        <Line key={at} x1={x(at)} x2={x(at)} y1={0} y2={height} stroke={colour.ink} strokeWidth={1} />
      ))}
    </>
  )
}

function Row({ row, spectrum, x }: { row: SpectrumRow; spectrum: SpectrumChartData; x: Scale }) {
  return (
    <View wrap={false} style={{ flexDirection: 'row', height: rowHeight }}>
      <Words base={8} style={{ width: nameWidth, textAlign: 'right', marginRight: 6, marginTop: 10 }}>
        {row.name}
      </Words>
      <View style={{ width: plotWidth, height: rowHeight }}>
        <Svg width={plotWidth} height={rowHeight} viewBox={`0 0 ${plotWidth} ${rowHeight}`}>
          <Behind spectrum={spectrum} x={x} height={rowHeight} />
          {row.lines.map(({ atA, isAsked }) => (
            <Line
              key={atA}
              x1={x(atA)}
              x2={x(atA)}
              y1={isAsked ? 10 : 15}
              y2={rowHeight}
              stroke={isAsked ? colour[row.tone] : colour.edge}
              strokeWidth={isAsked ? 1.8 : 0.75}
            />
          ))}
          <Line x1={0} x2={plotWidth} y1={rowHeight} y2={rowHeight} stroke={colour.rule} strokeWidth={0.75} />
        </Svg>
        {row.lines.map(({ atA, isAsked, words }) => (
          <Words
            key={atA}
            base={isAsked ? 7 : 6}
            style={{
              ...centred(x(atA), isAsked ? 4.6 * words.length : 40),
              top: isAsked ? 0 : 7,
              color: isAsked ? colour[row.tone] : colour.muted,
              fontWeight: isAsked ? 600 : 400,
            }}
          >
            {words}
          </Words>
        ))}
      </View>
    </View>
  )
}

/** Where the lines of the targets fall in a mode: a row an observation over its range, the air and the night sky. */
export function SpectrumChart({ spectrum }: { spectrum: SpectrumChartData }) {
  const { fromA, toA, bands, rows, modeName, mode } = spectrum
  const strip = spectrumStrip({
    from: fromA,
    to: toA,
    width: plotWidth,
    height: skyHeight,
    skyLines: spectrum.skyLinesA.map((at) => ({ at, strength: 1 })),
  })
  const x: Scale = (at) => Math.round(strip.x(at) * 10) / 10
  const left = { marginLeft: nameWidth + 6, width: plotWidth }
  return (
    <View>
      <View wrap={false} minPresenceAhead={3 * rowHeight}>
        <Heading>{`Where the lines fall: ${modeName}`}</Heading>
        <Words base={8.6} style={{ color: colour.muted, marginBottom: 6 }}>
          {`Sees ${formatNumber(mode.fromA)} to ${formatNumber(mode.toA)} Å between the upright lines. Tinted: bands of oxygen and water; ticks at the foot: bright lines of the night sky. Observed wavelengths in vacuum.`}
        </Words>
        <View style={{ ...left, height: 10 }}>
          {apart(bands, x).map((band) => (
            <Words
              key={band.fromA}
              base={6}
              style={{ ...centred(x((band.fromA + band.toA) / 2), 40), color: colour.muted }}
            >
              {band.name}
            </Words>
          ))}
        </View>
      </View>
      {rows.map((row, index) => (
        <Row key={index} row={row} spectrum={spectrum} x={x} />
      ))}
      <View wrap={false} style={left}>
        <Svg width={plotWidth} height={skyHeight + 4} viewBox={`0 0 ${plotWidth} ${skyHeight + 4}`}>
          <Behind spectrum={spectrum} x={x} height={skyHeight} />
          <Path
            d={strip.skyLines.map((sky) => `M${Math.round(sky.x * 10) / 10} ${skyHeight}V4`).join('')}
            stroke={colour.accent}
            strokeWidth={0.6}
          />
          <Line x1={0} x2={plotWidth} y1={skyHeight} y2={skyHeight} stroke={colour.ink} strokeWidth={0.75} />
          {strip.ticks.map((tick) => (
            <Line
              key={tick}
              x1={x(tick)}
              x2={x(tick)}
              y1={skyHeight}
              y2={skyHeight + 4}
              stroke={colour.ink}
              strokeWidth={0.75}
            />
          ))}
        </Svg>
        <View style={{ height: 12 }}>
          {strip.ticks.map((tick) => (
            <Words
              key={tick}
              base={size.unit}
              style={{ ...centred(x(tick), 40), left: x(tick) - 20, color: colour.muted }}
            >
              {formatNumber(tick)}
            </Words>
          ))}
        </View>
      </View>
    </View>
  )
}
