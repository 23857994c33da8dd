const isPicture = (bytes: Uint8Array) => bytes[0] === 0xff && bytes[1] === 0xd8

/** Segments a decoder needs: all but comments and what applications add, of which colour profile and Adobe's mark stay. */
function isNote(marker: number): boolean {
  return marker === 0xfe || (marker >= 0xe1 && marker <= 0xef && marker !== 0xe2 && marker !== 0xee)
}

/** A JPEG without comments, place, camera, author and thumbnail (ITU-T T.81, B.1.1.4); anything else as it is. */
export function withoutNotes(bytes: Uint8Array): Uint8Array {
  if (!isPicture(bytes)) return bytes
  const kept: Uint8Array[] = [bytes.subarray(0, 2)]
  let at = 2
  while (bytes[at] === 0xff) {
    const marker = bytes[at + 1] ?? 0
    // From the start of scan on there are no more headers before the pixels.
    if (marker === 0xda || marker === 0xd9) break
    const length = ((bytes[at + 2] ?? 0) << 8) | (bytes[at + 3] ?? 0)
    if (length < 2) break
    if (!isNote(marker)) kept.push(bytes.subarray(at, at + 2 + length))
    at += 2 + length
  }
  kept.push(bytes.subarray(at))
  return new Uint8Array(Buffer.concat(kept))
}
