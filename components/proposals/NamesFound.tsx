import { BarNote } from '@/components/ui/BarNote'
import type { NameFound } from '@/lib/domain/papers/namesIn'
import { countInWords, formatList } from '@/lib/format'

function where({ pages, inProperties }: NameFound): string {
  const on =
    pages.length > 0 ? `on ${pages.length === 1 ? 'page' : 'pages'} ${formatList(pages.map(String))}` : ''
  return [on, inProperties ? 'in the properties of the file' : ''].filter(Boolean).join(' and ')
}

/** Who could be recognised in a document that is read without names. It bars nothing: a citation may be meant. */
export function NamesFound({ found }: { found: readonly NameFound[] | null }) {
  if (found === null)
    return (
      <p className="m-0 text-table text-muted">The document cannot be looked through for names just now.</p>
    )
  if (found.length === 0)
    return <p className="m-0 text-table text-muted">No names of investigators found in it.</p>
  const onlyProperties = found.every(({ pages }) => pages.length === 0)
  return (
    <BarNote tone="lamp">
      <p className="m-0 font-semibold">{countInWords(found.length, 'name', 'names', true)} found</p>
      <ul className="m-0 mt-1 pl-5">
        {found.map((one) => (
          <li key={one.name} className="[overflow-wrap:anywhere]">
            {one.name}, {where(one)}
          </li>
        ))}
      </ul>
      <p className="m-0 mt-1 text-muted">
        {onlyProperties
          ? 'Properties are left out of what reviewers get.'
          : 'Reviewers read it without names. Write “earlier work” for your own, where you can.'}
      </p>
    </BarNote>
  )
}
