import { z } from 'zod'

const id = z.number().int().positive()

export const panelKeySchema = z.object({ panelId: id })
export type PanelKeyInput = z.output<typeof panelKeySchema>

/** A panel as an address names it. */
export const panelNumber = z
  .string()
  .regex(/^[1-9]\d{0,9}$/)
  .transform(Number)

/** A panel's table: by the call's address, and the panel where a person leads two. */
export const panelQuery = z.object({
  call: z.string().min(1).max(60),
  panel: panelNumber.optional(),
})

export const rowKey = id
