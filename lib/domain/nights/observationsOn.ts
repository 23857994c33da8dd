import type { ReportContents } from '../observations/reportContents'

/** The observations a request makes with one instrument, in their order: the parts of its line. */
export function observationsOn(
  contents: Pick<ReportContents, 'observations' | 'modes'>,
  instrumentId: number,
): ReportContents['observations'] {
  return contents.observations.filter(
    ({ modeId }) => contents.modes.find((mode) => mode.modeId === modeId)?.instrument.id === instrumentId,
  )
}
