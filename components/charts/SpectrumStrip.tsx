import { useId } from 'react'
import { formatNumber } from '@/lib/format'
import { spectrumStrip } from './geometry/spectrumStrip'

export interface SpectrumBand {
  from: number
  to: number
  /** Over half of the light lost: hatched; less: tinted. */
  heavy: boolean
  words: string
}

export interface SpectrumFeature {
  at: number
  label: string
  /** The feature that was asked for, in its verdict's colour. */
  verdict?: 'feasible' | 'marginal' | 'not-feasible'
}

export interface SpectrumStripProps {
  label: string
  /** The axis, and the instrument's own range on it, in `unit`. */
  from: number
  to: number
  instrument: { name: string; from: number; to: number }
  bands: readonly SpectrumBand[]
  skyLines?: readonly { at: number; strength: number }[]
  features: readonly SpectrumFeature[]
  model?: readonly (readonly [number, number])[]
  /** `observed wavelength in vacuum, Å`. */
  xLabel: string
}

const width = 1236
const height = 150
const top = 34

/** Where features fall: the instrument's range, bands of water, sky lines, the model spectrum. */
export function SpectrumStrip(props: SpectrumStripProps) {
  const { label, from, to, instrument, bands, skyLines, features, model, xLabel } = props
  const id = useId()
  const strip = spectrumStrip({ from, to, width, height, model, skyLines })
  const x = (at: number) => Math.min(width, Math.max(0, strip.x(at)))
  return (
    <svg
      viewBox={`-8 0 ${width + 16} ${top + height + 48}`}
      className="block w-full min-w-[720px] overflow-visible"
      role="img"
      aria-label={label}
    >
      <defs>
        <pattern id={id} width="6" height="6" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <path d="M0 0V6" stroke="var(--edge)" strokeWidth="1.2" />
        </pattern>
      </defs>
      <g transform={`translate(0 ${top})`}>
        <rect
          x={x(instrument.from)}
          width={x(instrument.to) - x(instrument.from)}
          height={height}
          fill="var(--surface)"
        />
        {bands.map((band) => (
          <g key={band.from}>
            <rect
              x={x(band.from)}
              width={x(band.to) - x(band.from)}
              height={height}
              fill={band.heavy ? `url(#${id})` : 'var(--tint)'}
            />
            <text
              x={x((band.from + band.to) / 2)}
              y="16"
              textAnchor="middle"
              fontSize="12"
              fill="var(--ink-muted)"
              className="ground-halo"
            >
              {band.words}
            </text>
          </g>
        ))}
        {[instrument.from, instrument.to].map((at) => (
          <path key={at} d={`M${x(at)} 0V${height}`} stroke="var(--ink)" strokeWidth="1.5" />
        ))}
        <text x={x(instrument.from) + 8} y={height - 38} fontSize="13" fontWeight="600" fill="var(--ink)">
          {instrument.name}
        </text>
        {strip.skyLines.map((sky) => (
          <path
            key={sky.x}
            d={`M${sky.x} ${height}V${height - sky.tall}`}
            stroke="var(--s3)"
            strokeWidth="1.2"
          />
        ))}
        <path d={strip.model} fill="none" stroke="var(--ink)" strokeWidth="1.6" />
        {features
          .filter(({ at }) => at >= from && at <= to)
          .map((feature) => (
            <g key={feature.label} fill={feature.verdict ? `var(--${feature.verdict})` : 'var(--ink)'}>
              <rect x={x(feature.at) - 0.5} y="-10" width={feature.verdict ? 2 : 1} height="50" />
              <text x={x(feature.at)} y="-16" textAnchor="middle" fontSize="13" fontWeight="600">
                {feature.label}
              </text>
            </g>
          ))}
        <path d={`M0 ${height}H${width}`} stroke="var(--ink)" />
        {strip.ticks.map((tick) => (
          <g key={tick} transform={`translate(${x(tick)} ${height})`} fill="var(--ink-muted)">
            <path d="M0 0V6" stroke="var(--ink)" />
            <text y="20" textAnchor="middle" fontSize="12">
              {formatNumber(tick)}
            </text>
          </g>
        ))}
        <text x={width} y={height + 40} textAnchor="end" fontSize="12.5" fill="var(--ink-muted)">
          {xLabel}
        </text>
      </g>
    </svg>
  )
}
