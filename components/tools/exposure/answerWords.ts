import type { Exposed } from '@/lib/domain/tools/expose'
import type { ExposureInput } from '@/lib/domain/tools/exposureSchema'
import { formatDuration, formatNumber, formatPower } from '@/lib/format'

function sourceWords(asked: ExposureInput, { limit }: Exposed): string {
  if (asked.source === 'line') {
    const flux = limit?.kind === 'line' ? limit.fluxErgSCm2 : Number(asked.flux.replace(',', '.'))
    return `a line of ${formatPower(flux)} erg/s/cm²`
  }
  const magnitude = limit?.kind === 'magnitude' ? formatNumber(limit.value, 2) : asked.magnitude
  const [band = '', system = ''] = asked.band.split(' ')
  return `${band} = ${magnitude} (${system})`
}

const perWords = { image: 'in the image', 'resolution-element': 'a resolution element' } as const

/** The answer in one sentence, its figure set apart to be printed strong. */
export function answerParts(
  asked: ExposureInput,
  exposed: Exposed,
  modeName: string,
  isImage: boolean,
): { before: string; figure: string; after: string } {
  const { report } = exposed
  const per = perWords[isImage ? 'image' : 'resolution-element']
  const frames = `${formatNumber(report.subExposures, 0)} sub-exposures of ${formatDuration(report.subExposureS)}`
  const total = `${formatDuration(report.totalS)} with overheads`
  const source = sourceWords(asked, exposed)
  if (asked.solve === 'time')
    return {
      before: `${modeName} reaches S/N ${asked.snr} ${per} on ${source} in `,
      figure: formatDuration(report.openS),
      after: ` of open shutter: ${frames}, ${total}.`,
    }
  if (asked.solve === 'snr')
    return {
      before: `In ${asked.hours} h of open shutter ${modeName} reaches on ${source} `,
      figure: `S/N ${formatNumber(report.snr, 1)}`,
      after: ` ${per}: ${frames}, ${total}.`,
    }
  return {
    before: `In ${asked.hours} h of open shutter ${modeName} reaches S/N ${asked.snr} ${per} down to `,
    figure: source,
    after: `: ${frames}, ${total}.`,
  }
}
