import { z } from 'zod'

/** A zod schema as JSON Schema: of what is sent, or of what comes back. */
export function schemaOf(schema: z.ZodType, io: 'input' | 'output'): Record<string, unknown> {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { io, target: 'draft-2020-12' })
  return rest
}
