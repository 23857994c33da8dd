import type { TextFlag } from '@/lib/domain/reviews/textFlags'
import { flagWords } from './flagWords'

const around = 28

/** Words of a text that deserve a second look, each as it stands between its neighbours. */
export function FlagList({ text, flags }: { text: string; flags: readonly TextFlag[] }) {
  if (flags.length === 0) return null
  return (
    <ul className="plain-list mt-2 border-l-4 border-lamp pl-3 text-caption">
      {flags.map((flag) => {
        const end = flag.at + flag.words.length
        return (
          <li key={`${flag.kind}-${flag.at}`} className="mt-1 [overflow-wrap:anywhere] first:mt-0">
            <span className="text-muted">
              “{flag.at > around ? '… ' : ''}
              {text.slice(Math.max(0, flag.at - around), flag.at)}
            </span>
            <strong>{text.slice(flag.at, end)}</strong>
            <span className="text-muted">
              {text.slice(end, end + around)}
              {text.length > end + around ? ' …' : ''}”
            </span>{' '}
            {flagWords[flag.kind]}
          </li>
        )
      })}
    </ul>
  )
}
