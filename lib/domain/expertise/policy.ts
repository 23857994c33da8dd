import { no, yes, type Decision } from '@/lib/auth/decision'
import { holds, type Actor } from '../actor'

/** Reviewers say what they know; nobody says it for them. */
export const mayStateExpertise = (actor: Actor): Decision =>
  holds(actor, 'reviewer') ? yes : no('role', 'Only reviewers say what they know.')
