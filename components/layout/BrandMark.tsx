/** The mark: a dome with its shutter open and one lamp. */
export function BrandMark({ size = 24 }: { size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 24 24" aria-hidden="true" focusable="false">
      <path
        d="M1.9 16.2A10.1 10.1 0 0 1 12.8 6.1M20 9.4A10.1 10.1 0 0 1 22.1 16.2M1 16.2H23M5 19.6H19"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.6"
      />
      <circle cx="16.7" cy="7.4" r="2.3" fill="var(--lamp)" />
    </svg>
  )
}
