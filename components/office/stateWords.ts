const words: Readonly<Record<string, string>> = {
  'under-review': 'under review',
  due: 'owed',
  invoiced: 'by invoice',
  refunded: 'given back',
}

/** States of proposals and fees as they are called on screen. */
export function stateWords(state: string): string {
  return words[state] ?? state
}
