import { z } from 'zod'
import { bandTable, darkSkyQuantity, extinctionQuantity } from './bandTableSchema'
import { horizonTable } from './horizonSchema'
import { quantity } from './quantity'
import { newRecordFields } from './newRecordSchema'
import { versionFields } from './recordSchema'
import { unfinishedWeather, weatherFields, weatherFrom } from './weatherSchema'
import type { SiteFacts } from './types'

const seeing = (what: string) => quantity({ what, low: 0.1, high: 10, unit: '″' })

function isTimeZone(name: string): boolean {
  try {
    new Intl.DateTimeFormat('en-GB', { timeZone: name })
    return true
  } catch {
    return false
  }
}

const fields = {
  latitudeDeg: quantity({ what: 'A latitude', low: -90, high: 90, unit: '°' }),
  longitudeDeg: quantity({ what: 'A longitude', low: -180, high: 180, unit: '°' }),
  elevationM: quantity({ what: 'A height', low: -500, high: 9000, unit: '\u00a0m' }),
  timeZone: z
    .string()
    .trim()
    .max(60, 'At most 60 characters fit here.')
    .refine(isTimeZone, 'This is not a time zone; one is called Etc/GMT+3, for instance.'),
  utcOffsetHours: quantity({ what: 'An offset from UTC', low: -12, high: 14, unit: '\u00a0h' }),
  lowestAltitudeDeg: quantity({ what: 'A lowest altitude', low: 0, high: 85, unit: '°' }),
  horizon: horizonTable,
  best10: seeing('The best tenth'),
  median: seeing('The median'),
  worst90: seeing('The poorest tenth'),
  ...weatherFields,
  extinction: bandTable(extinctionQuantity),
  darkSky: bandTable(darkSkyQuantity),
}

type Fields = z.output<z.ZodObject<typeof fields>>

/** Fields that only make sense together. */
function together(value: Fields, ctx: z.RefinementCtx): void {
  const say = (path: keyof Fields, message: string) => ctx.addIssue({ code: 'custom', path: [path], message })
  if (value.median < value.best10) say('median', 'The median is not sharper than the best tenth.')
  if (value.worst90 < value.median) say('worst90', 'The poorest tenth is not sharper than the median.')
  const unfinished = unfinishedWeather(value)
  if (unfinished) say(unfinished.path, unfinished.message)
}

const factsOf = ({
  best10,
  median,
  worst90,
  extinction,
  darkSky,
  lostByMonth,
  persistence,
  ...rest
}: Fields): SiteFacts => ({
  ...rest,
  extinctionMagPerAirmass: extinction,
  darkSkyMagArcsec2: darkSky,
  seeingArcsec: { best10, median, worst90 },
  weather: weatherFrom({ lostByMonth, persistence }),
})

/** A new version of a site's record: text as typed in, facts out. */
export const siteRecordSchema = z
  .object({ ...versionFields, ...fields })
  .superRefine(together)
  .transform(({ slug, over, validFrom, ...rest }) => ({ slug, over, validFrom, facts: factsOf(rest) }))

export type SiteForm = z.input<typeof siteRecordSchema>

/** A new site with its first record. */
export const newSiteSchema = z
  .object({ ...newRecordFields, ...fields })
  .superRefine(together)
  .transform(({ slug, name, validFrom, ...rest }) => ({ slug, name, validFrom, facts: factsOf(rest) }))

export type NewSiteForm = z.input<typeof newSiteSchema>
