import type { Metadata } from 'next'
import { HelpQuestion } from '@/components/help/HelpQuestion'
import { Main } from '@/components/layout/Main'
import { LedgerGroup } from '@/components/ui/LedgerGroup'
import { LedgerList } from '@/components/ui/LedgerList'
import { PageTitle } from '@/components/ui/PageTitle'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Help' }

export default async function HelpPage() {
  await openPage('/help')
  return (
    <Main>
      <PageTitle title="Help" lead="Short answers, by what one wants to do." />
      <div className="mt-6 max-w-5xl">
        <LedgerList>
          <LedgerGroup title="To ask for time">
            <HelpQuestion question="How do I begin?">
              Open an account, confirm the letter, choose the open call on{' '}
              <TextLink href={paths.calls()}>Calls</TextLink> and start a proposal. It saves as you type; half
              an hour and a list of targets will do for a first draft.
            </HelpQuestion>
            <HelpQuestion question="What if the deadline passes while I send?">
              What counts is when your request reached us, stamped by the observatory’s own clock, not when
              the answer reached you. If the confirmation was lost, look under Proposals: what is sent says
              so.
            </HelpQuestion>
            <HelpQuestion question="What if my card is refused?">
              The proposal is in all the same. The fee is settled within the days of grace that the call
              gives, or you ask for a waiver.
            </HelpQuestion>
            <HelpQuestion question="May I change what I sent?">
              Until the deadline, yes: reopen it. The version you sent stands until you send the next one.
            </HelpQuestion>
          </LedgerGroup>
          <LedgerGroup title="To read the numbers">
            <HelpQuestion question="Where does a number come from?">
              Press it: formula, inputs, source and, where there is one, the same number under a second
              cosmology.
            </HelpQuestion>
            <HelpQuestion question="What do feasible, marginal and not feasible mean?">
              Each check has two limits of its own. The engine informs; the instrument scientist’s assessment
              stands above it. <TextLink href={paths.helpMarks()}>How to read the signs</TextLink>
            </HelpQuestion>
          </LedgerGroup>
          <LedgerGroup title="To compute elsewhere">
            <HelpQuestion question="May my own program use these calculations?">
              Yes, without signing in, and clients of the virtual observatory may ask when a position is up.{' '}
              <TextLink href={paths.helpCalculations()}>Calculations for programs</TextLink>
            </HelpQuestion>
          </LedgerGroup>
          <LedgerGroup title="To judge">
            <HelpQuestion question="What do I declare?">
              Before you see any proposal you go through one list of everybody who is named in the call, and
              tick those with whom you have an interest. You can add to it at any time.
            </HelpQuestion>
            <HelpQuestion question="Who sees what I write?">
              Investigators read the comments meant for them after the decision, unsigned. Notes to the panel
              stay with the panel; private notes with you.
            </HelpQuestion>
          </LedgerGroup>
          <LedgerGroup title="If something is amiss">
            <HelpQuestion question="A page showed a reference number.">
              Something failed on our side and was logged under that number. Send it to the office:{' '}
              <TextLink href="mailto:office@quillonridge.example">office@quillonridge.example</TextLink>
            </HelpQuestion>
          </LedgerGroup>
        </LedgerList>
      </div>
    </Main>
  )
}
