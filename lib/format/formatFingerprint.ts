/** The first 16 digits of a SHA-256 in groups of four, as people compare them: `7c1e 94af 02d8 b35f`. */
export const formatFingerprint = (sha256: string): string =>
  (sha256.slice(0, 16).match(/.{4}/g) ?? []).join(' ')
