import type { Context } from '../context'
import { answerCsv } from './answerCsv'
import { answerTable } from './answerTable'
import { findObservability } from './findObservability'
import { readAsked } from './readAsked'

/** Reads a query, looks, and writes the answer in the format asked for. */
export async function answerObservability(
  ctx: Context,
  parameters: URLSearchParams,
): Promise<{ text: string; mediaType: string }> {
  const asked = readAsked(parameters)
  const found = await findObservability(ctx, asked)
  const { kind, mediaType } = asked.RESPONSEFORMAT
  return { mediaType, text: kind === 'csv' ? answerCsv(found) : answerTable(found, ctx.request.origin) }
}
