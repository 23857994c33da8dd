import type { SelectOption } from '@/components/forms/SelectField'
import { kindKeys } from '@/lib/domain/calls/kindKeyList'

const names: Readonly<Record<(typeof kindKeys)[number], string>> = {
  regular: 'Regular proposal',
  large: 'Large programme',
  thesis: 'Thesis',
  monitoring: 'Monitoring',
  opportunity: 'Target of opportunity',
  discretion: 'Director’s discretion',
}

/** Kinds of proposal for a list to choose from. */
export const kindOptions: SelectOption[] = kindKeys.map((value) => ({ value, label: names[value] }))
