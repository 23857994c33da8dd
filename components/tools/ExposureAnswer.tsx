import { BarNote } from '@/components/ui/BarNote'
import { Facts } from '@/components/ui/Facts'
import type { ModeRecord } from '@/lib/domain/facility/types'
import type { ExposureInput } from '@/lib/domain/tools/schema'
import { formatDuration, formatHours, formatNumber, formatPercent, formatQuantity } from '@/lib/format'
import type { ExposureReport, Regime } from '@/lib/science/exposure'

interface ExposureAnswerProps {
  mode: ModeRecord
  asked: ExposureInput
  answer: { report: ExposureReport; refusal: null } | { report: null; refusal: string }
}

const regimes: Record<Regime, string> = {
  source: 'the source itself',
  sky: 'the sky',
  read: 'read-out and dark current',
  floor: 'what is left of the sky after subtraction',
}

/** The answer in one sentence, then what it is made of. */
export function ExposureAnswer({ mode, asked, answer }: ExposureAnswerProps) {
  if (!answer.report) return <BarNote tone="not-feasible">{answer.refusal}</BarNote>
  const { report } = answer
  const per = mode.kind === 'imaging' ? 'in the image' : 'a resolution element'
  return (
    <>
      <p className="max-w-4xl text-lead">
        {mode.name} reaches S/N {asked.snr} {per} on {asked.magnitude} mag AB in{' '}
        <strong className="font-semibold">{formatHours(report.openS / 3600)}</strong> of open shutter:{' '}
        {formatNumber(report.subExposures, 0)} sub-exposures of {formatDuration(report.subExposureS)}, and{' '}
        <strong className="font-semibold">{formatHours(report.totalS / 3600)}</strong> with overheads.
      </p>
      <div className="mt-8 grid gap-x-16 gap-y-6 md:grid-cols-2">
        <Facts
          title="The light"
          facts={[
            { term: 'Image as delivered', value: `${formatNumber(report.imageArcsec, 2)}″` },
            {
              term: 'Aperture of best S/N, radius',
              value: `${formatNumber(report.apertureRadiusArcsec, 2)}″`,
            },
            { term: 'Light inside it', value: formatPercent(report.enclosedFraction, 0) },
            { term: 'Sky', value: formatQuantity(report.skyAbArcsec2, 2, 'mag AB arcsec⁻²') },
            { term: 'Wavelength', value: formatQuantity(report.wavelengthA, 0, 'Å') },
          ]}
        />
        <Facts
          title="The noise"
          facts={[
            { term: 'Most of it comes from', value: regimes[report.regime] },
            { term: 'Its share of the noise squared', value: formatPercent(report.regimeShare, 0) },
            { term: 'Time goes as the flux to the power', value: formatNumber(report.timeExponentOfFlux, 2) },
            { term: 'Electrons from the source', value: formatNumber(report.signalE, 0) },
            { term: 'Cosmology', value: 'an observed magnitude: it makes no difference' },
          ]}
        />
      </div>
      <p className="mt-4 text-caption text-muted">
        Signal-to-noise after Merline & Howell 1995; engine {report.engineVersion}; records{' '}
        {mode.recordVersion} and {mode.telescope.recordVersion}.
      </p>
    </>
  )
}
