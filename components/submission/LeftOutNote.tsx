import { BarNote } from '@/components/ui/BarNote'
import { TextLink } from '@/components/ui/TextLink'
import { leftOutWords } from '@/lib/domain/submission/leftOutWords'
import { paths } from '@/lib/paths'

/** Before sending: who would not be named in it, and why. Nothing where everyone has agreed. */
export function LeftOutNote({ reference, names }: { reference: string; names: readonly string[] }) {
  if (names.length === 0) return null
  return (
    <BarNote tone="lamp">
      <p className="m-0">
        It is sent without {leftOutWords(names)}. Until the deadline they may agree, and you send it again.
      </p>
      <p className="m-0 mt-1">
        <TextLink href={paths.proposalSection(reference, 'people')}>See who has agreed</TextLink>
      </p>
    </BarNote>
  )
}
