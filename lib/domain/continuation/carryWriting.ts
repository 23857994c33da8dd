import { insertFigure } from '@/db/queries/figures'
import { insertPaper } from '@/db/queries/papers'
import { insertStoredObject } from '@/db/queries/storedObjects'
import { putWriting } from '@/db/queries/writings'
import type { ActingContext } from '../context'
import type { ProposalContents } from '../proposals/types'
import type { Figure, Paper, WritingPart } from '../proposals/writingTypes'
import type { CopiedFile } from './copyFiles'

const parts: readonly WritingPart[] = ['justification', 'references', 'team']

export interface CopiedFiles {
  papers: readonly CopiedFile<Paper>[]
  figures: readonly CopiedFile<Figure>[]
}

/** Writes the texts, documents and figures of an earlier proposal into a new one. */
export async function carryWriting(
  tx: ActingContext,
  old: Pick<ProposalContents, 'writings'>,
  into: CopiedFiles & { proposalId: number },
): Promise<void> {
  const { proposalId, papers, figures } = into
  for (const part of parts) {
    const { text } = old.writings[part]
    if (text !== '') await putWriting(tx.db, { proposalId, part, text, version: 0 })
  }
  for (const { file, key } of papers) {
    const { sha256, sizeBytes, kind, fileName, pages } = file
    const stored = { key, sha256, sizeBytes, contentType: 'application/pdf', purpose: 'paper' as const }
    const objectId = await insertStoredObject(tx.db, stored)
    const uploadedBy = tx.actor.personId
    await insertPaper(tx.db, { proposalId, objectId, kind, fileName, pages, uploadedBy })
  }
  for (const { file, key } of figures) {
    const { sha256, sizeBytes, contentType, label, caption, fileName, widthPx, heightPx, position } = file
    const stored = { key, sha256, sizeBytes, contentType, purpose: 'figure' as const }
    const objectId = await insertStoredObject(tx.db, stored)
    const drawn = { label, caption, fileName, widthPx, heightPx, position }
    await insertFigure(tx.db, { proposalId, objectId, ...drawn })
  }
}
