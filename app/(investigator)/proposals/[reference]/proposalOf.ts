import 'server-only'
import { cache } from 'react'
import { contextFor } from '@/lib/auth/contextFor'
import { readActor } from '@/lib/auth/readActor'
import { requestFacts } from '@/lib/auth/requestFacts'
import { parseReference } from '@/lib/domain/proposals/reference'
import { readProposal } from '@/lib/domain/proposals/readProposal'

/** The proposal an address names, read once a request for layout and page alike. */
export const proposalOf = cache(async (typed: string) => {
  const ctx = contextFor(await readActor(), await requestFacts())
  return readProposal(ctx, parseReference(decodeURIComponent(typed)) ?? decodeURIComponent(typed))
})
