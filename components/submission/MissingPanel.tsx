import { Panel } from '@/components/ui/Panel'
import { TextLink } from '@/components/ui/TextLink'
import type { Missing } from '@/lib/domain/proposals/sections/finding'
import { countInWords } from '@/lib/format'

/** What stands between the proposal and being sent, each with the page that mends it. */
export function MissingPanel({ missing }: { missing: readonly Missing[] }) {
  const title = countInWords(missing.length, 'thing to mend', 'things to mend', true)
  return (
    <Panel bar="lamp" title={title}>
      <ul className="plain-list flex flex-col gap-3">
        {missing.map(({ section, sentence, href }) => (
          <li key={`${section} ${sentence}`} className="border-t border-rule pt-3">
            <TextLink href={href}>{sentence}</TextLink>
          </li>
        ))}
      </ul>
      <p className="mt-4 mb-0 text-table text-muted">It can be sent when nothing is left here.</p>
    </Panel>
  )
}
