/** The text of a file: UTF-16 where it begins so, UTF-8 where it is that, else the Windows code page. */
export function decodeText(bytes: ArrayBuffer): string {
  const start = new Uint8Array(bytes.slice(0, 2))
  const isWide = (start[0] === 0xff && start[1] === 0xfe) || (start[0] === 0xfe && start[1] === 0xff)
  if (isWide) return new TextDecoder(start[0] === 0xff ? 'utf-16le' : 'utf-16be').decode(bytes)
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes)
  } catch {
    return new TextDecoder('windows-1252').decode(bytes)
  }
}
