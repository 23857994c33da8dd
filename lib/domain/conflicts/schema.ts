import { z } from 'zod'
import { declaredKinds, type DeclaredKind } from './types'

const isKind = (text: string): text is DeclaredKind => declaredKinds.some((kind) => kind === text)

const tick = z
  .object({ ticked: z.boolean(), kind: z.string().max(20) })
  .refine(({ ticked, kind }) => !ticked || isKind(kind), {
    path: ['kind'],
    message: 'Say which kind of interest it is.',
  })

/** A reviewer's way through the list of names. */
export const declareInterestsSchema = z.object({
  callSlug: z.string().min(1).max(60),
  names: z
    .record(z.string().regex(/^n[0-9a-f]{16}$/), tick)
    .transform((names) =>
      Object.entries(names).flatMap(([key, { ticked, kind }]) =>
        ticked && isKind(kind) ? [{ key, kind }] : [],
      ),
    ),
  wentThrough: z.boolean().refine((done) => done, 'Go through the whole list first, then tick this.'),
})

export type DeclareInterestsInput = z.output<typeof declareInterestsSchema>
