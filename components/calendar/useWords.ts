import type { SelectOption } from '@/components/forms/SelectField'
import { nightUses, type NightUse } from '@/lib/domain/calls/nightUseList'

/** What a part of a night is for, in words. */
export const useWords: Readonly<Record<NightUse, string>> = {
  science: 'Science in this call',
  engineering: 'Engineering',
  promised: 'Promised before',
}

export const useOptions: SelectOption[] = nightUses.map((value) => ({ value, label: useWords[value] }))
