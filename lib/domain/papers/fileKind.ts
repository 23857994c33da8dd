const startsWith = (bytes: Uint8Array, ...head: number[]) =>
  head.every((byte, index) => bytes[index] === byte)

/** What a file is by its first bytes, whatever its name says: one of those taken, or words for what it is instead. */
export function fileKind(bytes: Uint8Array): 'pdf' | 'png' | 'jpeg' | { instead: string } {
  if (startsWith(bytes, 0x25, 0x50, 0x44, 0x46, 0x2d)) return 'pdf'
  if (startsWith(bytes, 0xff, 0xd8, 0xff)) return 'jpeg'
  if (startsWith(bytes, 0x89, 0x50, 0x4e, 0x47)) return 'png'
  if (startsWith(bytes, 0x50, 0x4b, 0x03, 0x04)) return { instead: 'a Word document or a ZIP archive' }
  if (startsWith(bytes, 0xd0, 0xcf, 0x11, 0xe0)) return { instead: 'an old Word document' }
  if (startsWith(bytes, 0x25, 0x21)) return { instead: 'a PostScript file' }
  if (startsWith(bytes, 0x5c)) return { instead: 'a TeX source' }
  return { instead: 'something else' }
}
