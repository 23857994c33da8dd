import type { Reference } from '@/lib/writing/references'
import type { Call } from '../calls/types'
import type { ModeRecord, SiteRecord } from '../facility/types'
import type { ProposalComputation } from '../observations/types'
import type {
  ChosenCosmology,
  ConstraintSet,
  Observation,
  ServiceWish,
  Target,
  TargetGroup,
} from '../proposals/types'
import type { Snapshot } from '../submission/snapshot'
import { readBibtex } from '../writings/readBibtex'

/**
 * What reviewers, the panel and instrument scientists read of a proposal: no people, no institutes, no
 * public reference, no file names, no moment of arrival. Built field by field, so that a field added to a
 * proposal stays hidden until someone decides otherwise.
 */
export interface AnonymousProposal {
  /** Call and three digits; null for a draft that was never sent. */
  reviewNumber: string | null
  call: Pick<Call, 'id' | 'number' | 'slug' | 'title' | 'seasonFrom' | 'seasonTo'>
  kind: { title: string; pageLimit: number; wordLimit: number }
  title: string
  abstract: string
  category: string
  cosmology: ChosenCosmology
  site: SiteRecord
  /** The modes the observations use. */
  modes: ModeRecord[]
  groups: TargetGroup[]
  targets: Target[]
  constraintSets: ConstraintSet[]
  observations: Observation[]
  /** How time is wished for, by instrument. */
  wishes: ServiceWish[]
  /** Pages of the justification; null when none is attached. */
  justification: { pages: number } | null
  /** The justification written here; null when a document stands in its place, or nothing is written. */
  written: AnonymousText | null
  computation: ProposalComputation
  engineVersion: string
}

export interface AnonymousText {
  text: string
  references: Reference[]
  figures: { label: string; caption: string; sha256: string; widthPx: number; heightPx: number }[]
}

/** The written text of a proposal with what it points to; null when a document stands in its place. */
function writtenOf({ papers, writings, figures }: Snapshot['contents']): AnonymousText | null {
  const isDocument = papers.some(({ kind }) => kind === 'justification')
  const { text } = writings.justification
  if (isDocument || text.trim() === '') return null
  return {
    text,
    references: readBibtex(writings.references.text).references,
    figures: figures.map(({ label, caption, sha256, widthPx, heightPx }) => ({
      label,
      caption,
      sha256,
      widthPx,
      heightPx,
    })),
  }
}

/** The projection of a snapshot that carries no identity. */
export function anonymise({ contents, computation, engineVersion }: Snapshot): AnonymousProposal {
  const used = new Set(contents.observations.map((observation) => observation.modeId))
  const justification = contents.papers.find((paper) => paper.kind === 'justification')
  const { id, number, slug, title, seasonFrom, seasonTo } = contents.call
  return {
    reviewNumber: contents.reviewNumber,
    call: { id, number, slug, title, seasonFrom, seasonTo },
    kind: {
      title: contents.kind.title,
      pageLimit: contents.kind.pageLimit,
      wordLimit: contents.kind.wordLimit,
    },
    title: contents.title,
    abstract: contents.abstract,
    category: contents.category,
    cosmology: contents.cosmology,
    site: contents.site,
    modes: contents.modes.filter((mode) => used.has(mode.modeId)),
    groups: contents.groups,
    targets: contents.targets,
    constraintSets: contents.constraintSets,
    observations: contents.observations,
    wishes: contents.wishes,
    justification: justification ? { pages: justification.pages } : null,
    written: writtenOf(contents),
    computation,
    engineVersion,
  }
}
