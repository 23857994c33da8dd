/** Who observes, as offered to choose from. */
export const serviceOptions = [
  { value: 'queue', label: 'queue', help: 'the observatory, whenever the sky suits' },
  { value: 'visitor', label: 'visitor', help: 'you, on nights of your own' },
]

/** Which of a night, as offered to choose from. */
export const partOptions = [
  { value: 'whole', label: 'the whole' },
  { value: 'first', label: 'first half' },
  { value: 'second', label: 'second half' },
]
