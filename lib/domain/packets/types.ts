export type { AnonymousProposal } from './anonymise'
