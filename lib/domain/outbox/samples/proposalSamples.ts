import { paths } from '@/lib/paths'
import { callCorrected } from '../letters/callCorrected'
import { deadlineExtended } from '../letters/deadlineExtended'
import { deadlineMoved } from '../letters/deadlineMoved'
import { decisionLetter } from '../letters/decision'
import { leadOffered } from '../letters/leadOffered'
import { leadTaken } from '../letters/leadTaken'
import { namedOnProposal } from '../letters/namedOnProposal'
import { paperReplaced } from '../letters/paperReplaced'
import { repairOpened } from '../letters/repairOpened'
import { proposalSent } from '../letters/proposalSent'
import { proposalWithdrawn } from '../letters/proposalWithdrawn'
import { staffQuestion } from '../letters/staffQuestion'
import type { LetterSample } from './letterSample'

/** Letters to investigators about their proposal. */
export const proposalSamples: readonly LetterSample[] = [
  {
    template: 'named-on-proposal',
    title: 'Somebody is named on a proposal',
    build: ({ of, origin }) =>
      of.second === null
        ? null
        : namedOnProposal({
            toName: of.second,
            byName: of.lead,
            title: of.title,
            reference: of.reference,
            callTitle: of.call.title,
            deadline: of.call.closesAt,
            mayEdit: true,
            hasAccount: true,
            url: origin + paths.proposalSection(of.reference, 'people'),
          }),
  },
  {
    template: 'lead-offered',
    title: 'Somebody is asked to lead a proposal',
    build: ({ of, origin }) =>
      of.second === null
        ? null
        : leadOffered({
            toName: of.second,
            byName: of.lead,
            title: of.title,
            reference: of.reference,
            callTitle: of.call.title,
            url: origin + paths.proposalSection(of.reference, 'people'),
          }),
  },
  {
    template: 'lead-taken',
    title: 'Somebody else leads the proposal now',
    build: ({ of, origin }) =>
      of.second === null
        ? null
        : leadTaken({
            toName: of.lead,
            byName: of.second,
            title: of.title,
            reference: of.reference,
            url: origin + paths.proposalSection(of.reference, 'people'),
          }),
  },
  {
    template: 'deadline-moved',
    title: 'The deadline moves; to everyone with a draft',
    build: ({ of, origin }) =>
      deadlineMoved(
        { name: of.lead, references: [of.reference] },
        { ...of.call, why: 'The network of the observatory was down for a day.' },
        origin + paths.proposal(of.reference),
      ),
  },
  {
    template: 'deadline-extended',
    title: 'One proposal has a deadline of its own; to everyone named',
    build: ({ of, origin }) =>
      deadlineExtended(
        {
          name: of.lead,
          reference: of.reference,
          call: of.call,
          closesAt: of.call.closesAt,
          why: 'The file did not get through.',
        },
        origin + paths.proposal(of.reference),
      ),
  },
  {
    template: 'call-corrected',
    title: 'The call is corrected; to everyone on a proposal',
    build: ({ of, origin }) =>
      callCorrected(
        {
          name: of.lead,
          callNumber: of.call.number,
          concerns: 'the width of a slit',
          body: 'It is 1.2 arcsec wide, not 1.0.',
        },
        origin + paths.proposal(of.reference),
      ),
  },
  {
    template: 'repair-opened',
    title: 'A paper may be replaced; to those who lead',
    build: ({ of, origin }) =>
      repairOpened(
        {
          name: of.lead,
          reference: of.reference,
          kind: 'justification',
          reason: 'The file of another proposal was sent.',
          openUntil: of.call.closesAt,
        },
        origin + paths.proposalSection(of.reference, 'papers'),
      ),
  },
  {
    template: 'proposal-sent',
    title: 'A proposal is in',
    build: ({ of, origin }) =>
      of.version === null
        ? null
        : proposalSent({
            name: of.lead,
            title: of.title,
            reference: of.reference,
            callNumber: of.call.number,
            versionNumber: of.version.number,
            arrivedAt: of.version.arrivedAt,
            deadline: of.call.closesAt,
            sha256: of.version.sha256,
            fee: of.fee,
            url: origin + paths.proposalSent(of.reference),
          }),
  },
  {
    template: 'proposal-sent-again',
    sentAs: 'proposal-sent',
    title: 'A paper was replaced; to everyone named',
    build: ({ of, origin }) =>
      of.version === null
        ? null
        : paperReplaced(
            {
              name: of.lead,
              reference: of.reference,
              fileName: 'justification.pdf',
              versionNumber: of.version.number,
              arrivedAt: of.version.arrivedAt,
              sha256: of.version.sha256,
            },
            origin + paths.proposalSent(of.reference),
          ),
  },
  {
    template: 'proposal-withdrawn',
    title: 'A proposal is withdrawn',
    build: ({ of, origin }) =>
      proposalWithdrawn({
        name: of.lead,
        title: of.title,
        reference: of.reference,
        by: of.lead,
        fee: of.fee === null ? 'none' : of.fee.state === 'paid' ? 'refunded' : 'cancelled',
        url: origin + paths.proposal(of.reference),
      }),
  },
  {
    template: 'staff-question',
    title: 'An instrument scientist asks',
    build: ({ of, origin }) =>
      of.question === null
        ? null
        : staffQuestion({
            name: of.lead,
            reference: of.reference,
            ...of.question,
            url: origin + paths.proposal(of.reference),
          }),
  },
  {
    template: 'decision',
    title: 'The panel has decided',
    build: ({ of, origin }) =>
      of.decision === null
        ? null
        : decisionLetter(
            { name: of.lead },
            { callNumber: of.call.number, reference: of.reference, title: of.title, ...of.decision },
            origin + paths.proposalOutcome(of.reference),
          ),
  },
]
