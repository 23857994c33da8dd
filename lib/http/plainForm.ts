/** Form data as a plain object; a repeated field becomes an array, and what the framework adds is left out. */
export function plainForm(form: FormData): Record<string, unknown> {
  const object: Record<string, unknown> = Object.create(null)
  for (const key of new Set(form.keys())) {
    if (key.startsWith('$')) continue
    const values = form.getAll(key)
    object[key] = values.length > 1 ? values : values[0]
  }
  return object
}
