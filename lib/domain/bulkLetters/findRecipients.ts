import type { Database } from '@/db/client'
import { holdersToWrite, investigatorsToWrite, type Recipient } from '@/db/queries/recipients'
import type { Role } from '../actor'
import type { Audience } from './schema'

const isRole = (part: Audience['parts'][number]): part is Exclude<typeof part, 'lead' | 'named'> & Role =>
  part !== 'lead' && part !== 'named'

/** Everyone a letter is for, each once however many parts they play, by name. */
export async function findRecipients(db: Database, audience: Audience): Promise<Recipient[]> {
  const callId = audience.callId ? Number(audience.callId) : null
  const { parts, states } = audience
  const leadsOnly = !parts.includes('named')
  const named =
    parts.includes('lead') || parts.includes('named')
      ? await investigatorsToWrite(db, { callId, states, leadsOnly })
      : []
  const roles = parts.filter(isRole)
  const holders = roles.length > 0 ? await holdersToWrite(db, { roles, callId }) : []
  const all = new Map<number, Recipient>()
  const add = ({ failedAt, ...row }: (typeof holders)[number]): Recipient => {
    const known = all.get(row.personId)
    const { personId, name, email, institute } = row
    const one = known ?? { personId, name, email, institute, addressFails: failedAt !== null, proposals: [] }
    all.set(personId, one)
    return one
  }
  for (const { reference, title, ...row } of named) add(row).proposals.push({ reference, title })
  for (const row of holders) add(row)
  return [...all.values()]
}
