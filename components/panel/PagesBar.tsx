/** Pages as a bar against the heaviest load. */
export function PagesBar({ pages, most }: { pages: number; most: number }) {
  return (
    <svg width="120" height="12" aria-hidden="true" focusable="false" className="inline-block">
      <path d="M0 10.5H120" stroke="var(--edge)" />
      <rect y="3" width={(120 * pages) / most} height="7" fill="var(--s1)" />
    </svg>
  )
}
