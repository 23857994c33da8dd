/** A moment on the band, 0 to 1 from its start; outside the night there is none. */
export function BandMark({ share, height }: { share: number; height: number }) {
  if (share < 0 || share > 1) return null
  const x = `${(share * 100).toFixed(3)}%`
  return (
    <g data-testid="band-mark">
      <line x1={x} x2={x} y1="0" y2={height} stroke="var(--now)" strokeWidth="2" />
      <circle cx={x} cy={height / 2} r="3.5" fill="var(--now)" />
    </g>
  )
}
