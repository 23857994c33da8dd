import type { PacketData } from '@/pdf/packet/packetTypes'
import { awaitedWords } from '../observations/awaitedWords'
import { groupHoursSentence, groupSentence } from '../observations/groupWords'
import type { AnonymousProposal } from './anonymise'

/** Under the table of targets: what the rules of groups come to, what is awaited, and why some hours stand in brackets. */
export function packetRules({
  targets,
  computation,
}: Pick<AnonymousProposal, 'targets' | 'computation'>): PacketData['rules'] {
  const isBracketed = computation.observations.some(({ times }) => times === 0)
  return [
    ...computation.groups.map((group) => ({
      name: group.name,
      text: `${groupSentence(group)} ${groupHoursSentence(group)}`,
      verdict: group.rule === 'backup' ? null : group.verdict,
    })),
    ...targets.flatMap((target) => {
      const text = awaitedWords(target)
      return text ? [{ name: target.name, text, verdict: null }] : []
    }),
    ...(isBracketed
      ? [{ name: '', text: 'Hours in brackets are not counted in those of all.', verdict: null }]
      : []),
  ]
}
