import { DateTimeField } from '@/components/forms/DateTimeField'

export const callDateFields = [
  ['opensAt', 'Opens'],
  ['closesAt', 'Proposals close'],
  ['graceUntil', 'Fees settled by'],
  ['assessmentsDueAt', 'Assessments in by'],
  ['reviewsDueAt', 'Reviews in by'],
  ['panelMeetsAt', 'Panel meets'],
  ['lettersAt', 'Letters go out'],
] as const

/** The seven dates of a call, in the order they come. */
export function CallDateFields({ utcOffsetHours }: { utcOffsetHours?: number }) {
  return (
    <div className="grid gap-x-8 gap-y-6 xl:grid-cols-2">
      {callDateFields.map(([name, label]) => (
        <DateTimeField key={name} name={name} label={label} utcOffsetHours={utcOffsetHours} />
      ))}
    </div>
  )
}
