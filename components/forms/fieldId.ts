/** The id of a field's control: summaries link to it, labels point at it. */
export function fieldId(formId: string, name: string): string {
  return `${formId}-${name}`
}
