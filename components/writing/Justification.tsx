import { BarNote } from '@/components/ui/BarNote'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { ProposalContents } from '@/lib/domain/proposals/types'
import { formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'
import { citationsOf } from '@/lib/writing/citations'
import { parseText } from '@/lib/writing/parseText'
import type { ReferenceList } from '@/lib/writing/references'
import { unknownFigures } from '@/lib/writing/unknownFigures'
import { figuresAllowed } from '@/lib/domain/writings/limits'
import { FigureList } from './FigureList'
import type { FigureActions } from './figureActions'
import { ReferencesForm } from './ReferencesForm'
import { ReferencesRead } from './ReferencesRead'
import { TextForm, type SaveWriting } from './TextForm'
import { Written } from './Written'

export interface JustificationProps {
  contents: Pick<ProposalContents, 'reference' | 'kind' | 'writings' | 'figures' | 'papers'>
  list: ReferenceList
  /** Null for those who only look. */
  actions: { save: SaveWriting; figures: FigureActions } | null
}

/** The justification written here: text with its preview, figures, references. */
export function Justification({ contents, list, actions }: JustificationProps) {
  const { reference, kind, writings, figures, papers } = contents
  const isDocument = papers.some((paper) => paper.kind === 'justification')
  const text = writings.justification.text
  const tree = parseText(text)
  const citations = citationsOf(tree, list.references)
  const lost = unknownFigures(
    tree,
    figures.map(({ label }) => label),
  )
  const shown = figures.map(({ id, label, caption, sha256, widthPx, heightPx }) => ({
    label,
    caption,
    widthPx,
    heightPx,
    href: paths.proposalFigure(reference, id, sha256),
  }))
  return (
    <>
      <section className="mb-10">
        <SectionHeading dense title="Justification" aside={`at most ${formatNumber(kind.wordLimit)} words`} />
        {isDocument ? (
          <div className="mt-3 max-w-prose">
            <BarNote tone="lamp">
              <p className="m-0">
                A PDF stands below: it is what reviewers get. What is written here is kept, and counts again
                once the PDF is taken off.
              </p>
            </BarNote>
          </div>
        ) : null}
        <div className="mt-4">
          {actions ? (
            <TextForm
              reference={reference}
              part="justification"
              kept={writings.justification}
              wordLimit={kind.wordLimit}
              label="Text"
              help="Markdown: # heading, **weight**, *stress*, - list. A formula stands between $ and $, or $$ and $$ on lines of their own. Leave out who you are."
              references={list.references}
              figures={shown}
              save={actions.save}
            />
          ) : text ? (
            <div className="max-w-prose">
              <Written text={text} references={list.references} figures={shown} />
            </div>
          ) : (
            <p className="m-0 text-muted">Nothing is written here.</p>
          )}
        </div>
      </section>
      <section className="mb-10">
        <SectionHeading dense title="Figures" aside="set after the paragraph that names them" />
        {lost.length > 0 ? (
          <div className="my-3 max-w-prose">
            <BarNote tone="lamp">
              {lost.map(({ label, line }) => (
                <p key={label} className="m-0 [overflow-wrap:anywhere]">
                  Line {formatNumber(line)} of the text points to {label}, which no figure is called.
                </p>
              ))}
            </BarNote>
          </div>
        ) : null}
        <FigureList
          most={figuresAllowed(kind)}
          reference={reference}
          figures={figures}
          actions={actions?.figures ?? null}
        />
      </section>
      <section className="mb-10">
        <SectionHeading dense title="References" aside="numbered as they are cited" />
        <div className="mt-3 grid gap-x-10 gap-y-6 lg:grid-cols-2">
          {actions ? (
            <ReferencesForm reference={reference} kept={writings.references} save={actions.save} />
          ) : null}
          <div className="min-w-0">
            <ReferencesRead {...list} citations={citations} />
          </div>
        </div>
      </section>
    </>
  )
}
