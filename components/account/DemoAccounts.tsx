'use client'

import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { Panel } from '@/components/ui/Panel'
import { TextLink } from '@/components/ui/TextLink'
import { fillSignIn } from './fillSignIn'

interface DemoAccountsProps {
  accounts: readonly { role: string; name: string; email: string; password: string }[]
  inboxUrl: string | undefined
}

/** The demonstration's accounts, one a role; a press fills the form. */
export function DemoAccounts({ accounts, inboxUrl }: DemoAccountsProps) {
  return (
    <Panel bar="lamp" title="This is a demonstration">
      <p className="text-table text-muted">
        It runs on this machine alone, with invented people. Every account has the password{' '}
        <strong className="font-semibold text-ink">{accounts[0]?.password}</strong>.
      </p>
      <ul className="plain-list mt-4">
        {accounts.map((account) => (
          <li key={account.email} className="border-t border-rule py-2.5">
            <span className="block text-table text-muted">{account.role}</span>
            <span className="flex flex-wrap items-baseline justify-between gap-x-4">
              <span className="font-semibold">{account.name}</span>
              <LinkLikeButton
                onClick={() => fillSignIn(account)}
                aria-label={`Fill in the form as ${account.name}, ${account.role}`}
              >
                Fill in
              </LinkLikeButton>
            </span>
            <span className="block text-table">{account.email}</span>
          </li>
        ))}
      </ul>
      {inboxUrl ? (
        <p className="border-t border-rule pt-3 text-table">
          Letters go to a <TextLink href={inboxUrl}>local inbox</TextLink>, never further.
        </p>
      ) : null}
    </Panel>
  )
}
