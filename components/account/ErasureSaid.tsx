import type { ErasureView } from '@/lib/domain/people/erasureWords'

/** What would be erased, what would stay and why, and what stands in the way. */
export function ErasureSaid({ erasure }: { erasure: ErasureView }) {
  return (
    <>
      {erasure.inTheWay.length > 0 ? (
        <div className="mb-4 border-l-4 border-not-feasible pl-4 text-table">
          <p className="m-0 font-semibold">What comes first</p>
          {erasure.inTheWay.map((sentence) => (
            <p key={sentence} className="m-0">
              {sentence}
            </p>
          ))}
        </div>
      ) : null}
      <h3 className="text-body font-semibold">What goes</h3>
      <ul className="plain-list mb-4 text-table">
        {erasure.goes.map((line) => (
          <li key={line} className="border-b border-rule py-2">
            {line}
          </li>
        ))}
      </ul>
      <h3 className="text-body font-semibold">What stays, and why</h3>
      <ul className="plain-list text-table">
        {erasure.stays.map(({ what, why }) => (
          <li key={what} className="border-b border-rule py-2">
            {what}
            <span className="block text-muted">{why}</span>
          </li>
        ))}
      </ul>
    </>
  )
}
