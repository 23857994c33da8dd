import type { SelectOption } from '@/components/forms/SelectField'

export interface CarrierChoice {
  slug: string
  name: string
  /** Choices of one group stand together under its name. */
  group?: string
}

/** What may carry something new as the lines of a list; chosen beforehand where there is only one. */
export function carrierOptions(carriers: readonly CarrierChoice[]): {
  options: SelectOption[]
  chosen: string
} {
  const options = carriers.map(({ slug, name, group }) => ({ value: slug, label: name, group }))
  return { options, chosen: options.length === 1 ? (options[0]?.value ?? '') : '' }
}
