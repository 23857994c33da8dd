'use client'

import { useRouter } from 'next/navigation'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { ChooseByField } from '@/components/forms/stale/ChooseByField'
import { useOpenedOver } from '@/components/forms/stale/useOpenedOver'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { showToast } from '@/components/ui/showToast'
import { billingSchema, type BillingForm } from '@/lib/domain/billing/schema'
import type { BillingFacts } from '@/lib/domain/billing/types'
import { formatAccount } from '@/lib/format'
import { billingLabels } from './billingLabels'

interface BillingFormViewProps {
  version: number
  facts: BillingFacts | null
  action: FormAction<BillingForm, { recordVersion: number }>
}

const empty: BillingFacts = {
  name: '',
  address: '',
  taxNumber: '',
  contact: '',
  accountHolder: '',
  iban: '',
  bic: '',
  bank: '',
}

/** As the fields keep them: the account in groups of four. */
const typed = (facts: BillingFacts): BillingFacts => ({ ...facts, iban: formatAccount(facts.iban) })

/** Who writes invoices and where they are paid to. A save is a new version; written papers keep theirs. */
export function BillingFormView({ version, facts, action }: BillingFormViewProps) {
  const router = useRouter()
  const values = typed(facts ?? empty)
  const opened = useOpenedOver({ version, values })
  const handle = useActionForm({
    schema: billingSchema,
    action: (given) => action({ ...given, over: opened.version }),
    defaultValues: { over: version, ...values },
    onStale: (stale) =>
      opened.onStale({
        ...stale,
        theirs: { ...stale.theirs, iban: formatAccount(String(stale.theirs.iban)) },
      }),
    onDone: ({ recordVersion }) => {
      showToast(`Version ${recordVersion} holds for what is written from now on`)
      router.refresh()
    },
  })
  const mine = (): BillingFacts => {
    const { over: _, ...given } = handle.form.getValues()
    return given
  }
  return (
    <ActionForm form={handle} label="What invoices say">
      {opened.stale ? (
        <ChooseByField
          stale={opened.stale}
          versions={opened.versions(mine())}
          labels={billingLabels}
          onChoose={(chosen) => {
            opened.settle()
            handle.form.reset({ over: opened.version, ...chosen })
          }}
        />
      ) : null}
      <SectionHeading title="Who writes them" />
      <div className="grid gap-x-8 gap-y-6 md:grid-cols-2">
        <TextField name="name" label={billingLabels.name} />
        <TextField name="contact" label={billingLabels.contact} help="An e-mail address" />
        <TextAreaField name="address" label={billingLabels.address} rows={3} />
        <TextField name="taxNumber" label={billingLabels.taxNumber} optional />
      </div>
      <SectionHeading title="Where they are paid to" />
      <div className="grid gap-x-8 gap-y-6 md:grid-cols-2">
        <TextField name="accountHolder" label={billingLabels.accountHolder} />
        <TextField name="bank" label={billingLabels.bank} />
        <TextField
          name="iban"
          label={billingLabels.iban}
          help="Its check digits are computed: one wrong character is found."
        />
        <TextField name="bic" label={billingLabels.bic} help="8 or 11 characters" width="medium" />
      </div>
      <div>
        <SubmitButton busyWord="Saving">Save as a new version</SubmitButton>
      </div>
    </ActionForm>
  )
}
