import { z } from 'zod'
import { horizonTable } from './horizonSchema'
import { carrier, newRecordFields } from './newRecordSchema'
import { optionalQuantity, quantity } from './quantity'
import { versionFields } from './recordSchema'

const fields = {
  apertureM: quantity({ what: 'An aperture', low: 0.1, high: 100, unit: '\u00a0m' }),
  collectingAreaM2: quantity({ what: 'A collecting area', low: 0.005, high: 8000, unit: '\u00a0m²' }),
  highestAltitudeDeg: optionalQuantity({ what: 'A highest altitude', low: 60, high: 89.99, unit: '°' }),
  horizon: horizonTable,
}

type Fields = z.output<z.ZodObject<typeof fields>>

function together(value: Fields, ctx: z.RefinementCtx): void {
  if (value.collectingAreaM2 > (Math.PI / 4) * value.apertureM ** 2 * 1.0001)
    ctx.addIssue({
      code: 'custom',
      path: ['collectingAreaM2'],
      message: 'No more light is collected than the aperture is wide: π/4 times its square is the most.',
    })
}

/** A new version of a telescope's record: text as typed in, facts out. */
export const telescopeRecordSchema = z
  .object({ ...versionFields, ...fields })
  .superRefine(together)
  .transform(({ slug, over, validFrom, ...facts }) => ({ slug, over, validFrom, facts }))

export type TelescopeForm = z.input<typeof telescopeRecordSchema>

/** A new telescope of a site with its first record. */
export const newTelescopeSchema = z
  .object({ ...newRecordFields, of: carrier('site'), ...fields })
  .superRefine(together)
  .transform(({ slug, name, of, validFrom, ...facts }) => ({ slug, name, of, validFrom, facts }))

export type NewTelescopeForm = z.input<typeof newTelescopeSchema>
