import type { Context } from '../context'
import { readFacility } from '../facility/readFacility'
import type { ModeRecord } from '../facility/types'

function describeMode(mode: ModeRecord) {
  return {
    id: mode.modeId,
    slug: mode.slug,
    name: mode.name,
    instrument: mode.instrument.name,
    telescope: mode.telescope.name,
    kind: mode.kind,
    band: mode.band,
    wavelengthMinA: mode.wavelengthMinA,
    wavelengthMaxA: mode.wavelengthMaxA,
    medium: mode.medium,
    pixelScaleArcsec: mode.pixelScaleArcsec,
    slitWidthArcsec: mode.slitWidthArcsec,
    resolvingPower: mode.resolvingPower,
    minSubExposureS: mode.minSubExposureS,
    maxSubExposureS: mode.maxSubExposureS,
    recordVersion: mode.recordVersion,
  }
}

/** Every instrument mode of the observatory, with the record in force today. */
export async function listModes(ctx: Context) {
  const { modes } = await readFacility(ctx)
  return modes.map(describeMode)
}
