import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import type { ActionResult } from '@/lib/actions/result'
import type { Paper } from '@/lib/domain/proposals/writingTypes'
import { countInWords, formatBytes, formatUtc } from '@/lib/format'
import { paths } from '@/lib/paths'
import { PaperUpload } from './PaperUpload'
import { RemovePaper } from './RemovePaper'

export interface PaperSlotProps {
  reference: string
  kind: Paper['kind']
  title: string
  help: string
  pageLimit: number
  paper: Paper | null
  /** Null for those who only look. */
  actions: {
    remove: (input: { reference: string; kind: Paper['kind'] }) => Promise<ActionResult<unknown>>
  } | null
}

/** One document of a proposal: what stands, what was found in it, and how to put another in its place. */
export function PaperSlot({ reference, kind, title, help, pageLimit, paper, actions }: PaperSlotProps) {
  return (
    <section className="mb-10">
      <SectionHeading dense title={title} aside={`at most ${countInWords(pageLimit, 'page')}`} />
      {paper ? (
        <div className="mt-3 mb-4">
          <p className="m-0 flex flex-wrap items-baseline gap-x-4 gap-y-1 [overflow-wrap:anywhere]">
            <TextLink plain strong href={paths.proposalPaper(reference, paper.id)}>
              {paper.fileName}
            </TextLink>
            <span className="text-table text-muted">
              {countInWords(paper.pages, 'page')}, {formatBytes(paper.sizeBytes)}, kept{' '}
              {formatUtc(paper.uploadedAt)}
            </span>
            {actions ? (
              <span className="text-table">
                <RemovePaper
                  reference={reference}
                  kind={kind}
                  fileName={paper.fileName}
                  remove={actions.remove}
                />
              </span>
            ) : null}
          </p>
        </div>
      ) : null}
      {actions ? (
        <div className="mt-3">
          <PaperUpload
            to={paths.newPaper(reference)}
            kind={kind}
            label={paper ? 'Put another in its place' : 'The file'}
            help={help}
          />
        </div>
      ) : null}
      {!paper && !actions ? <p className="mt-3 text-muted">None.</p> : null}
    </section>
  )
}
