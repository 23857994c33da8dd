/** Words of one kind inside a paragraph. Nothing here can carry a script, a style or a picture from elsewhere. */
export type Inline =
  | { kind: 'text'; text: string }
  | { kind: 'strong' | 'emphasis'; inlines: Inline[] }
  | { kind: 'code'; text: string }
  /** TeX between single dollars. `line` counts from 1 in the text as typed. */
  | { kind: 'formula'; tex: string; line: number }
  /** Only http, https and mailto. */
  | { kind: 'link'; href: string; inlines: Inline[] }
  /** `[@key]` or `[@one; @two]`. */
  | { kind: 'cite'; keys: string[]; line: number }
  /** `[@fig:label]`. */
  | { kind: 'figure'; label: string; line: number }
  | { kind: 'break' }

export type Block =
  /** Level 1 to 3; deeper ones are set as 3. */
  | { kind: 'heading'; level: 1 | 2 | 3; inlines: Inline[] }
  | { kind: 'paragraph'; inlines: Inline[] }
  | { kind: 'list'; start: number | null; items: Block[][] }
  | { kind: 'quote'; blocks: Block[] }
  | { kind: 'code'; text: string }
  /** TeX between double dollars, on a line of its own. */
  | { kind: 'formula'; tex: string; line: number }
  /** The first row is the head. */
  | { kind: 'table'; rows: Inline[][][]; align: ('left' | 'right' | 'center' | null)[] }
  | { kind: 'rule' }

/** A text as it is set. */
export type Written = Block[]
