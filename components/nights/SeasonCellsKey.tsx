const keys = [
  ['dark', 'var(--moon-dark)'],
  ['grey', 'var(--moon-grey)'],
  ['bright', 'var(--moon-bright)'],
  ['free', 'var(--surface)'],
] as const

/** What the cells of the seasons mean. */
export function SeasonCellsKey() {
  return (
    <p className="mt-4 flex flex-wrap gap-x-6 gap-y-1 text-caption text-muted">
      <span>Half-months across, sidereal time up, h. A cell is as wide as its dark hours.</span>
      {keys.map(([name, fill]) => (
        <span key={name} className="inline-flex items-center gap-2">
          <svg width="20" height="12" aria-hidden="true" focusable="false">
            <rect x="0.5" y="0.5" width="19" height="11" fill={fill} stroke="var(--edge)" strokeWidth="0.8" />
          </svg>
          {name}
        </span>
      ))}
    </p>
  )
}
