const ticked = new Set(['checkbox', 'radio', 'file'])

/** What stands in a field of text, where it differs from what the server sent; the element still knows that. */
export function typedInto(element: Element | null): string | null {
  const isText =
    element instanceof HTMLTextAreaElement ||
    (element instanceof HTMLInputElement && !ticked.has(element.type))
  return isText && element.value !== element.defaultValue ? element.value : null
}
