import { refuse } from '../errors'

/** Refuses a body that does not say it is of a media type; parameters such as a character set are let pass. */
export function requireMediaType(request: Request, mediaType: string): void {
  const given = request.headers.get('content-type')?.split(';')[0]?.trim().toLowerCase() ?? ''
  if (given !== mediaType) throw refuse.mediaType(`Send this with Content-Type: ${mediaType}.`)
}
