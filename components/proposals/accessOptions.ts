/** What a co-investigator may do, in words. */
export const accessOptions = [
  { value: 'read', label: 'may read' },
  { value: 'edit', label: 'may read and change' },
  { value: 'deputy', label: 'may also send and name people' },
]
