/** The engine's own version as people name it, without those of its parts, which the record keeps: `1.4.0`. */
export const formatEngine = (engineVersion: string): string => engineVersion.split('+')[0] ?? engineVersion
