import type { NightsView } from '@/lib/domain/decisions/nightsView'

/** What the bars of the facing hours mean. */
export function FacingKey({ telescopes }: Pick<NightsView, 'telescopes'>) {
  return (
    <p className="mt-3 flex flex-wrap gap-x-6 gap-y-1 text-caption text-muted">
      {telescopes.map((telescope, index) => (
        <span key={telescope.id} className="inline-flex items-center gap-2">
          <svg width="20" height="12" aria-hidden="true" focusable="false">
            <rect width="20" height="12" fill={index === 0 ? 'var(--s1)' : 'var(--s3)'} />
          </svg>
          {telescope.name}
        </span>
      ))}
      <span>outline: asked; tick: least useful award; dashed: the line</span>
    </p>
  )
}
