import { BarNote } from '@/components/ui/BarNote'
import { Facts } from '@/components/ui/Facts'
import { placesWords } from '@/lib/domain/anonymity/placesWords'
import type { Recognised } from '@/lib/domain/anonymity/readGiveaways'
import type { Giveaway } from '@/lib/domain/anonymity/types'
import { countInWords } from '@/lib/format'

const kinds: Readonly<Record<Giveaway['kind'], string>> = {
  name: 'a name of the team',
  institute: 'an institute of the team',
  address: 'an e-mail address',
  orcid: 'an ORCID iD',
  phrase: 'wording that claims a work as yours',
}

/** By what the investigators could be recognised, with every place. It bars nothing: the author decides. */
export function Recognisable({ found, properties, isDocumentUnread }: Recognised) {
  return (
    <>
      {isDocumentUnread ? (
        <p className="m-0 mb-3 text-table text-muted">The PDF cannot be looked through just now.</p>
      ) : null}
      {found.length === 0 ? (
        <p className="m-0 text-table text-muted">
          Nothing found: no name, institute, address or ORCID iD of the team, and no wording that claims a
          work.
        </p>
      ) : (
        <BarNote tone="lamp">
          <p className="m-0 font-semibold">
            {countInWords(found.length, 'thing', 'things', true)} to look at
          </p>
          <ul className="m-0 mt-1 pl-5">
            {found.map((one) => (
              <li key={`${one.kind} ${one.what}`} className="[overflow-wrap:anywhere]">
                {one.kind === 'phrase' ? `“${one.what}”` : one.what}{' '}
                <span className="text-muted">({kinds[one.kind]})</span>, {placesWords(one)}
              </li>
            ))}
          </ul>
          <p className="m-0 mt-1 text-muted">
            You decide: nothing here bars the sending. A citation in the third person is no harm; “earlier
            work showed” says as much as “we showed”.
          </p>
        </BarNote>
      )}
      {properties.length > 0 ? (
        <div className="mt-4">
          <p className="m-0 mb-1 text-table text-muted">
            The PDF says this about itself. All of it is left out of what reviewers get.
          </p>
          <Facts facts={properties.map(({ name, value }) => ({ term: name, value }))} />
        </div>
      ) : null}
    </>
  )
}
