import { seriesTones, type SeriesTone } from '@/components/charts/geometry/chartTypes'

/** The line and colour of a cosmology, by its place in the list. */
export const toneOf = (place: number): SeriesTone => seriesTones[place % seriesTones.length] ?? 's1'
