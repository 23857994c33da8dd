import { ChartFrame } from '@/components/charts/ChartFrame'
import { LineChart } from '@/components/charts/LineChart'
import { BarNote } from '@/components/ui/BarNote'
import { Facts } from '@/components/ui/Facts'
import type { ModeRecord } from '@/lib/domain/facility/types'
import { snrCurve } from '@/lib/domain/observations/rules'
import type { Exposed } from '@/lib/domain/tools/expose'
import type { ExposureInput } from '@/lib/domain/tools/exposureSchema'
import { formatNumber, formatPercent, formatQuantity } from '@/lib/format'
import { answerParts } from './answerWords'
import { NoiseShares } from './NoiseShares'

interface ExposureAnswerProps {
  mode: ModeRecord
  asked: ExposureInput
  exposed: Exposed
  /** The mode works far from the band in which the magnitude was measured. */
  isFar: boolean
}

const skyWords = {
  around: 'from pixels around the source',
  paired: 'in pairs of frames, which doubles its noise',
  'blank-sky': 'from frames of blank sky, which take as long again',
} as const

const farWords =
  'The mode works far from the band of the magnitude: the source is taken as flat in f_ν between them. Say what its spectrum is.'

/** The answer in one sentence, then what it is made of. */
export function ExposureAnswer({ mode, asked, exposed, isFar }: ExposureAnswerProps) {
  const { report } = exposed
  const isImage = mode.kind === 'imaging'
  const { before, figure, after } = answerParts(asked, exposed, mode.name, isImage)
  const points = snrCurve(report, report.openS, 2 * report.openS)
  return (
    <>
      <p className="max-w-4xl text-lead" aria-live="polite">
        {before}
        <strong className="font-semibold">{figure}</strong>
        {after}
      </p>
      {exposed.carried ? <p className="mt-2 max-w-4xl text-table text-muted">{exposed.carried}</p> : null}
      {[...report.warnings, ...(isFar ? [farWords] : [])].map((warning) => (
        <div key={warning} className="mt-3">
          <BarNote tone="marginal">{warning}</BarNote>
        </div>
      ))}
      <div className="mt-8 grid gap-x-16 gap-y-10 lg:grid-cols-2">
        <ChartFrame
          title="Signal-to-noise against open shutter"
          fileName="exposure"
          numbers={{
            caption: 'Signal-to-noise against open shutter',
            columns: [
              { head: 'Open shutter', unit: 'h', decimals: 4 },
              { head: 'Signal-to-noise', decimals: 2 },
            ],
            rows: points,
          }}
        >
          <LineChart
            fluid
            label={`Signal-to-noise grows to ${formatNumber(points.at(-1)?.[1], 1)} in twice the time.`}
            series={[{ id: 'snr', name: mode.name, tone: 's1', points, chosen: true }]}
            labels="inside"
            xLabel="open shutter, h"
            guides={[{ y: report.snr, words: `S/N ${formatNumber(report.snr, 1)}` }]}
            marks={[report.openS / 3600]}
            xDecimals={3}
          />
        </ChartFrame>
        <NoiseShares variance={report.variance} />
        <Facts
          title="The light"
          facts={[
            { term: 'Image as delivered', value: `${formatNumber(report.imageArcsec, 2)}″` },
            {
              term: 'Aperture of best S/N',
              value: `radius ${formatNumber(report.apertureRadiusArcsec, 2)}″`,
            },
            { term: 'Light inside it', value: formatPercent(report.enclosedFraction, 0) },
            { term: 'Electrons from the source', value: formatNumber(report.signalE, 0) },
            { term: 'Brightest pixel', value: `${formatPercent(report.peakFraction, 0)} of full well` },
            { term: 'Wavelength', value: formatQuantity(report.wavelengthA, 0, 'Å') },
          ]}
        />
        <Facts
          title="The sky"
          facts={[
            {
              term: `Sky, ${report.skyBand}`,
              value: formatQuantity(report.skyAbArcsec2, 2, 'mag AB arcsec⁻²'),
            },
            { term: 'Taken off', value: skyWords[mode.skySubtraction] },
            { term: 'Left after subtraction', value: formatPercent(mode.systematicFloor, 2) },
            { term: 'Time goes as the flux to the power', value: formatNumber(report.timeExponentOfFlux, 2) },
            { term: 'Overheads', value: formatQuantity(report.overheadS / 60, 0, 'min') },
            { term: 'Cosmology', value: 'an observed brightness: it makes no difference' },
          ]}
        />
      </div>
      <p className="mt-6 text-caption text-muted">
        Signal-to-noise after Merline & Howell 1995, images by Moffat and Sérsic profiles; engine{' '}
        {report.engineVersion}; mode record {mode.recordVersion}, telescope record{' '}
        {mode.telescope.recordVersion}. A planning estimate: the observatory’s instrument staff have the last
        word.
      </p>
    </>
  )
}
