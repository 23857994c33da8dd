import { z } from 'zod'
import { reference } from '../proposals/schema'

export const paperKind = z.enum(['justification', 'team-expertise'])

/** What the browser sends: the file, and what it knows of it, so that a broken journey is noticed. */
export const uploadPaperSchema = z.object({
  reference,
  kind: paperKind,
  file: z.instanceof(File, { message: 'Choose a file.' }),
  sha256: z.string().regex(/^[0-9a-f]{64}$/, 'The browser did not say what it sent. Try again.'),
  sizeBytes: z
    .string()
    .regex(/^\d{1,10}$/, 'The browser did not say how much it sent. Try again.')
    .transform(Number),
})

export const removePaperSchema = z.object({ reference, kind: paperKind })
