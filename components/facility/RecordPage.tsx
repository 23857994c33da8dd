import type { ReactNode } from 'react'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import type { FieldWords } from '@/lib/domain/facility/recordForm'
import type { RecordPage as Read } from '@/lib/domain/facility/recordPage'
import { RecordRetirement } from './RecordRetirement'
import { RecordVersions } from './RecordVersions'
import { stampInWords } from './recordWords'

export interface RecordPageProps<Facts> {
  record: Read<Facts>
  back: { label: string; href: string }
  fields: Readonly<Record<string, FieldWords>>
  /** Facts as the form holds them, to be compared field by field. */
  typed: (facts: Facts) => Readonly<Record<string, unknown>>
  /** Where its retirement is said, for those who may. */
  retirement?: string
  /** The form. */
  children: ReactNode
}

/** A page on one record: the form of its next version, and all versions beside it. */
export function RecordPage<Facts>(props: RecordPageProps<Facts>) {
  const { record, back, fields, typed, retirement, children } = props
  const { name, newest, versions, retiredFrom, today } = record
  const stamp = stampInWords(newest, today)
  return (
    <Main>
      <Breadcrumb steps={[back, { label: name }]} />
      <PageTitle title={name} lead={`This is ${stamp}. What you change is saved as a new record.`} />
      <RecordRetirement name={name} retiredFrom={retiredFrom} today={today} href={retirement} />
      <div className="mt-8">
        <TwoColumns
          side={
            <RecordVersions
              fields={fields}
              today={today}
              versions={versions.map(({ facts, ...version }) => ({ ...version, typed: typed(facts) }))}
            />
          }
        >
          {children}
        </TwoColumns>
      </div>
    </Main>
  )
}
