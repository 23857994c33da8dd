import { Refusal } from '@/lib/errors'
import type { Context } from '../context'
import { boundedMap } from '../observations/boundedMap'
import type { Investigator, Paper } from '../proposals/types'
import { namesIn, type NameFound } from './namesIn'
import { pdfText, type PdfText } from './pdfText'
import { storedBytes } from './storedBytes'

const kept = boundedMap<PdfText>(60)

/** Names of investigators in a stored document; null while the store does not give it. */
export async function readPaperNames(
  ctx: Pick<Context, 'storage'>,
  paper: Pick<Paper, 'objectKey' | 'sha256'>,
  people: readonly Investigator[],
): Promise<NameFound[] | null> {
  try {
    const text = kept.get(paper.sha256) ?? (await pdfText(await storedBytes(ctx, paper)))
    kept.set(paper.sha256, text)
    return namesIn(text, people)
  } catch (error) {
    if (error instanceof Refusal) return null
    throw error
  }
}
