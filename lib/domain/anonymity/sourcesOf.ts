import type { ProposalContents } from '../proposals/types'
import type { Source, SourceName } from './types'

const lines = (name: SourceName, text: string): Source => ({
  name,
  parts: text.split('\n').map((line, index) => ({ at: index + 1, text: line })),
})

/** What reviewers read of a proposal, but for its document: the written parts only where no document stands. */
export function sourcesOf(
  contents: Pick<
    ProposalContents,
    'title' | 'abstract' | 'constraintSets' | 'writings' | 'figures' | 'papers'
  >,
): Source[] {
  const { title, abstract, constraintSets, writings, figures, papers } = contents
  const said = constraintSets.flatMap(({ cadence }) => (cadence ? [{ at: null, text: cadence }] : []))
  const head: Source[] = [
    { name: 'title', parts: [{ at: null, text: title }] },
    lines('abstract', abstract),
    ...(said.length > 0 ? [{ name: 'conditions' as const, parts: said }] : []),
  ]
  if (papers.some(({ kind }) => kind === 'justification')) return head
  return [
    ...head,
    lines('text', writings.justification.text),
    {
      name: 'captions',
      parts: figures.map(({ label, caption }, index) => ({ at: index + 1, text: `${label} ${caption}` })),
    },
    lines('references', writings.references.text),
  ]
}
