import { formatQuantity } from './formatQuantity'

/** The size of a file in decimal units: `812 kB`, `1.2 MB`. */
export function formatBytes(bytes: number): string {
  if (bytes < 1000) return formatQuantity(bytes, 0, 'B')
  if (bytes < 999_500) return formatQuantity(bytes / 1000, 0, 'kB')
  if (bytes < 999_950_000) return formatQuantity(bytes / 1e6, 1, 'MB')
  return formatQuantity(bytes / 1e9, 1, 'GB')
}
