import { createHash } from 'node:crypto'
import type { z } from 'zod'
import { databaseNow } from '@/db/queries/clock'
import { figuresOf, insertFigure, putPicture } from '@/db/queries/figures'
import { touchProposal } from '@/db/queries/proposals'
import { insertStoredObject } from '@/db/queries/storedObjects'
import { refuse } from '@/lib/errors'
import { countInWords } from '@/lib/format'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { newObjectKey } from '../objects/objectKey'
import { arrivedFile } from '../papers/arrivedFile'
import { shownName } from '../papers/shownName'
import { openForEditing } from '../proposals/openProposal'
import { figureLabel } from './figureLabel'
import { inspectPicture } from './inspectPicture'
import { figuresAllowed } from './limits'
import type { uploadFigureSchema } from './schema'

export type UploadFigureInput = z.output<typeof uploadFigureSchema>

export interface UploadedFigure {
  figureId: number
  label: string
  fileName: string
}

/** Asked before the slow looking through; asked again when it is written. */
async function demandRoom(tx: Context, input: UploadFigureInput) {
  const opened = await openForEditing(tx, input.reference)
  const figures = await figuresOf(tx.db, opened.row.id)
  const standing = figures.find(({ id }) => id === input.figureId) ?? null
  if (input.figureId !== null && !standing) throw refuse.notFound('figure')
  const most = figuresAllowed(opened.subject.kind)
  if (!standing && figures.length >= most)
    throw refuse.field('file', `A justification has at most ${countInWords(most, 'figure')}.`)
  return { ...opened, figures, standing }
}

/**
 * Keeps a picture as a new figure, or in the place of the picture of one that stands. The object is put before its
 * row is written, so that no row ever points at nothing; one without a row is swept later.
 */
export async function uploadFigure(ctx: Context, input: UploadFigureInput): Promise<UploadedFigure> {
  await inTransaction(ctx, (tx) => demandRoom(tx, input))
  const fileName = shownName(input.file.name, 'figure')
  const picture = await inspectPicture(await arrivedFile(input), fileName)
  const key = newObjectKey(ctx.random, await databaseNow(ctx.db))
  await ctx.storage.put(key, picture.bytes, picture.contentType)

  return inTransaction(ctx, async (tx) => {
    const { row, figures, standing } = await demandRoom(tx, input)
    const sha256 = createHash('sha256').update(picture.bytes).digest('hex')
    const kept = input.again
      ? figures.find((figure) => figure.sha256 === sha256 && figure.fileName === fileName)
      : undefined
    if (kept && !standing) return { figureId: kept.id, label: kept.label, fileName }
    const objectId = await insertStoredObject(tx.db, {
      key,
      sha256,
      sizeBytes: picture.bytes.length,
      contentType: picture.contentType,
      purpose: 'figure',
    })
    const { widthPx, heightPx } = picture
    const label =
      standing?.label ??
      figureLabel(
        fileName,
        figures.map((figure) => figure.label),
      )
    const drawn = { objectId, fileName, widthPx, heightPx }
    let figureId = standing?.id
    if (figureId !== undefined) await putPicture(tx.db, figureId, drawn)
    else
      figureId = await insertFigure(tx.db, {
        ...drawn,
        proposalId: row.id,
        label,
        caption: '',
        position: (figures.at(-1)?.position ?? 0) + 1,
      })
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: standing ? 'figure.replace' : 'figure.add',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: standing ? { label, sha256: standing.sha256 } : undefined,
      after: { label, sha256 },
    })
    return { figureId, label, fileName }
  })
}
