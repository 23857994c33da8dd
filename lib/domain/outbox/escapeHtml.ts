const escapes: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
}

/** Text for HTML, in an element or in an attribute between quotes. */
export const escapeHtml = (text: string): string =>
  text.replace(/[&<>"']/g, (character) => escapes[character] ?? character)
