import { z } from 'zod'
import { horizonTable } from './horizonSchema'
import { optionalQuantity, quantity } from './quantity'
import { versionFields } from './recordSchema'

/** A new version of a telescope's record: text as typed in, facts out. */
export const telescopeRecordSchema = z
  .object({
    ...versionFields,
    apertureM: quantity({ what: 'An aperture', low: 0.1, high: 100, unit: '\u00a0m' }),
    collectingAreaM2: quantity({ what: 'A collecting area', low: 0.005, high: 8000, unit: '\u00a0m²' }),
    highestAltitudeDeg: optionalQuantity({ what: 'A highest altitude', low: 60, high: 89.99, unit: '°' }),
    horizon: horizonTable,
  })
  .superRefine((value, ctx) => {
    if (value.collectingAreaM2 > (Math.PI / 4) * value.apertureM ** 2 * 1.0001)
      ctx.addIssue({
        code: 'custom',
        path: ['collectingAreaM2'],
        message: 'No more light is collected than the aperture is wide: π/4 times its square is the most.',
      })
  })
  .transform(({ slug, over, validFrom, ...facts }) => ({ slug, over, validFrom, facts }))

export type TelescopeForm = z.input<typeof telescopeRecordSchema>
