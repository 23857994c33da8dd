import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { readFacility } from '../facility/readFacility'
import { readTelescopes } from '../facility/readTelescopes'
import type { ModeRecord, SiteRecord } from '../facility/types'
import { scienceMode, scienceSite } from '../observations/scienceRecords'
import type { ExposureRequest } from './exposureSchema'
import { solveExposure } from './solveExposure'

/** The answer to a request, with the mode and the site it names. */
export function answerExposure(asked: ExposureRequest, mode: ModeRecord, site: SiteRecord) {
  const { report, limit, colourMag } = solveExposure(asked, scienceMode(mode), scienceSite(site))
  return {
    engine: report.engineVersion,
    mode: { id: mode.modeId, slug: mode.slug, name: mode.name },
    records: {
      site: site.recordVersion,
      telescope: mode.telescope.recordVersion,
      mode: mode.recordVersion,
    },
    solve: asked.solve,
    snr: report.snr,
    per: report.per,
    limit: limit && {
      ab: limit.kind === 'magnitude' ? limit.ab : null,
      fluxErgSCm2: limit.kind === 'line' ? limit.fluxErgSCm2 : null,
    },
    colourMag,
    openS: report.openS,
    subExposures: report.subExposures,
    subExposureS: report.subExposureS,
    overheadS: report.overheadS,
    totalS: report.totalS,
    signalE: report.signalE,
    varianceE2: { ...report.variance },
    noise: { mostly: report.regime, share: report.regimeShare },
    wavelengthA: report.wavelengthA,
    imageArcsec: report.imageArcsec,
    apertureRadiusArcsec: report.apertureRadiusArcsec,
    enclosedFraction: report.enclosedFraction,
    pixels: report.pixels,
    skyAbArcsec2: report.skyAbArcsec2,
    peakFraction: report.peakFraction,
    warnings: report.warnings,
  }
}

/** Signal-to-noise, time or limit with an instrument mode of the observatory, by the records in force today. */
export async function computeExposure(ctx: Context, asked: ExposureRequest) {
  const [{ modes }, { telescopes }] = await Promise.all([readFacility(ctx), readTelescopes(ctx)])
  const mode = modes.find(({ modeId, slug }) => modeId === asked.mode || slug === asked.mode)
  const site = telescopes.find(({ id }) => id === mode?.telescope.id)?.site
  if (!mode || !site)
    throw refuse.field('mode', `No mode is called “${asked.mode}”; GET /api/v1/modes lists them.`)
  return answerExposure(asked, mode, site)
}
