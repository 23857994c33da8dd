import 'server-only'
import { cache } from 'react'
import { openPage } from '@/lib/auth/openPage'
import { readProgramme } from '@/lib/domain/continuation/readProgramme'
import { proposalOf } from './proposalOf'

/** The programme of the proposal an address names, read once a request. */
export const programmeOf = cache(async (typed: string) => {
  const ctx = await openPage('/proposals/[reference]')
  return readProgramme(ctx, (await proposalOf(typed)).contents)
})
