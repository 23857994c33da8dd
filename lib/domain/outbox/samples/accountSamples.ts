import { paths } from '@/lib/paths'
import { whatStays } from '../../people/erasureWords'
import { accountExists } from '../letters/accountExists'
import { confirmAddress } from '../letters/confirmAddress'
import { erasureAsked } from '../letters/erasureAsked'
import { invitationLetter } from '../letters/invitation'
import { passwordChanged } from '../letters/passwordChanged'
import { personErased } from '../letters/personErased'
import { resetPasswordLetter } from '../letters/resetPassword'
import { roleGiven } from '../letters/roleGiven'
import type { LetterSample } from './letterSample'

// Stands where a real letter has its secret.
const token = 'secret'

/** Letters about an account, tried on whoever leads the proposal. */
export const accountSamples: readonly LetterSample[] = [
  {
    template: 'confirm-address',
    title: 'Somebody registers',
    build: ({ of, origin }) => confirmAddress({ name: of.lead }, origin + paths.confirm(token)),
  },
  {
    template: 'account-exists',
    title: 'Somebody registers an address that is known',
    build: ({ of, origin }) => accountExists({ name: of.lead }, origin + paths.forgotPassword()),
  },
  {
    template: 'reset-password',
    title: 'A new password is asked for',
    build: ({ of, origin }) => resetPasswordLetter({ name: of.lead }, origin + paths.resetPassword(token)),
  },
  {
    template: 'password-changed',
    title: 'A password was changed',
    build: ({ of, origin }) => passwordChanged({ name: of.lead }, origin + paths.forgotPassword()),
  },
  {
    template: 'invitation',
    title: 'Somebody is invited to a role',
    build: ({ of, clerk, origin }) =>
      invitationLetter(
        { name: of.lead },
        'reviewer',
        `the panel of call ${of.call.number}`,
        clerk,
        origin + paths.invitation(token),
      ),
  },
  {
    template: 'role-given',
    title: 'An account is given a role',
    build: ({ of, origin }) =>
      roleGiven({
        name: of.lead,
        role: 'reviewer',
        where: `the panel of call ${of.call.number}`,
        fromAt: null,
        untilAt: of.call.reviewsDueAt,
        url: origin + paths.account(),
      }),
  },
  {
    template: 'erasure-asked',
    title: 'Somebody asks to be erased; to the office',
    build: ({ of, clerk, origin }) =>
      erasureAsked({ name: clerk, asks: of.lead, url: origin + paths.office('people') }),
  },
  {
    template: 'person-erased',
    title: 'Somebody was erased; to the address as it was',
    build: ({ of }) => {
      const kept = {
        sentProposals: of.version ? 1 : 0,
        reviews: 0,
        assessments: 0,
        fees: of.fee ? 1 : 0,
        deeds: 0,
      }
      return personErased({
        name: of.lead,
        stays: whatStays(kept).map(({ what, why }) => `${what}. ${why}`),
      })
    },
  },
]
