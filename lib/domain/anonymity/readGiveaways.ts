import { Refusal } from '@/lib/errors'
import type { Context } from '../context'
import { boundedMap } from '../observations/boundedMap'
import { pdfText, type PdfText } from '../papers/pdfText'
import { storedBytes } from '../papers/storedBytes'
import type { ProposalContents } from '../proposals/types'
import type { Paper } from '../proposals/writingTypes'
import { giveawaysIn } from './giveawaysIn'
import { sourcesOf } from './sourcesOf'
import type { Giveaway, Source } from './types'

export interface Recognised {
  found: Giveaway[]
  /** What programs wrote into the document; it is left out of what reviewers get. */
  properties: PdfText['properties']
  /** A document stands, and could not be looked through just now. */
  isDocumentUnread: boolean
}

const kept = boundedMap<PdfText>(60)

async function textOf(
  ctx: Pick<Context, 'storage'>,
  paper: Pick<Paper, 'objectKey' | 'sha256'>,
): Promise<PdfText | null> {
  try {
    const text = kept.get(paper.sha256) ?? (await pdfText(await storedBytes(ctx, paper)))
    kept.set(paper.sha256, text)
    return text
  } catch (error) {
    if (error instanceof Refusal) return null
    throw error
  }
}

const documentSources = ({ pages, properties }: PdfText): Source[] => [
  { name: 'document', parts: pages.map((text, index) => ({ at: index + 1, text })) },
  { name: 'properties', parts: [{ at: null, text: properties.map(({ value }) => value).join(' \n ') }] },
]

/** By what the investigators could be recognised in everything reviewers read of a proposal. */
export async function readGiveaways(
  ctx: Pick<Context, 'storage'>,
  contents: Pick<
    ProposalContents,
    'constraintSets' | 'title' | 'abstract' | 'writings' | 'figures' | 'papers' | 'people'
  >,
): Promise<Recognised> {
  const paper = contents.papers.find(({ kind }) => kind === 'justification')
  const text = paper ? await textOf(ctx, paper) : null
  const sources = [...sourcesOf(contents), ...(text ? documentSources(text) : [])]
  return {
    found: giveawaysIn(sources, contents.people),
    properties: text?.properties ?? [],
    isDocumentUnread: paper !== undefined && text === null,
  }
}
