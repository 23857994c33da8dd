import { panelNumber } from '@/lib/domain/panels/schema'

export interface PanelPageProps {
  params: Promise<{ call: string }>
  searchParams: Promise<Record<string, string | string[] | undefined>>
}

/** The call in the address and, where a person leads two panels, the one asked for. */
export async function panelKey({
  params,
  searchParams,
}: PanelPageProps): Promise<{ callSlug: string; panelId?: number }> {
  const [{ call }, { panel }] = await Promise.all([params, searchParams])
  const asked = panelNumber.safeParse(panel)
  return { callSlug: call, ...(asked.success ? { panelId: asked.data } : {}) }
}
