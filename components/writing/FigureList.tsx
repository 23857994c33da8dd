import type { Figure } from '@/lib/domain/proposals/writingTypes'
import { maxFigureBytes } from '@/lib/domain/writings/limits'
import { countInWords, formatBytes, formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'
import { FigureForm } from './FigureForm'
import { FigureTools } from './FigureTools'
import { FigureUpload } from './FigureUpload'
import type { FigureActions } from './figureActions'

export interface FigureListProps {
  /** The most figures there may be. */
  most: number
  reference: string
  figures: readonly Figure[]
  /** Null for those who only look. */
  actions: FigureActions | null
}

/** Figures in their order, each with its words and the way to put another picture in its place. */
export function FigureList({ most, reference, figures, actions }: FigureListProps) {
  return (
    <>
      {figures.length > 0 ? (
        <ol className="plain-list">
          {figures.map((figure, index) => (
            <li
              key={figure.id}
              className="grid gap-x-10 gap-y-4 border-t border-rule py-5 lg:grid-cols-[20rem_minmax(0,1fr)]"
            >
              <div className="min-w-0">
                {/* eslint-disable-next-line @next/next/no-img-element */}
                <img
                  src={paths.proposalFigure(reference, figure.id, figure.sha256)}
                  alt={`Figure ${index + 1}: ${figure.fileName}`}
                  width={figure.widthPx}
                  height={figure.heightPx}
                  className="block h-auto max-h-64 w-auto max-w-full border border-rule"
                />
                <p className="m-0 mt-2 text-caption [overflow-wrap:anywhere] text-muted">
                  {figure.fileName}, {formatNumber(figure.widthPx)} × {formatNumber(figure.heightPx)} px,{' '}
                  {formatBytes(figure.sizeBytes)}
                </p>
              </div>
              <div className="min-w-0">
                <div className="mb-3 flex flex-wrap items-center justify-between gap-3">
                  <h3 className="m-0 text-body font-semibold">Figure {index + 1}</h3>
                  {actions ? (
                    <FigureTools
                      reference={reference}
                      id={figure.id}
                      number={index + 1}
                      isFirst={index === 0}
                      isLast={index === figures.length - 1}
                      actions={actions}
                    />
                  ) : null}
                </div>
                {actions ? (
                  <>
                    <FigureForm
                      reference={reference}
                      figure={figure}
                      number={index + 1}
                      save={actions.save}
                    />
                    <div className="mt-4">
                      <FigureUpload
                        reference={reference}
                        figureId={figure.id}
                        label="Another picture in its place"
                      />
                    </div>
                  </>
                ) : (
                  <p className="m-0">{figure.caption || 'Without a caption.'}</p>
                )}
              </div>
            </li>
          ))}
        </ol>
      ) : null}
      {actions && figures.length < most ? (
        <div className="max-w-3xl border-t border-rule pt-5">
          <FigureUpload
            reference={reference}
            figureId={null}
            label={figures.length === 0 ? 'A picture' : 'One more picture'}
            help={`PNG or JPEG of at most ${formatBytes(maxFigureBytes)}; ${countInWords(most, 'figure')} at most. It is drawn anew: place, camera and other notes in the file are left behind.`}
          />
        </div>
      ) : null}
      {!actions && figures.length === 0 ? <p className="mt-3 text-muted">None.</p> : null}
    </>
  )
}
