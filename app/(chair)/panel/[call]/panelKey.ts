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
  const panelId = typeof panel === 'string' && /^[1-9]\d{0,9}$/.test(panel) ? Number(panel) : undefined
  return { callSlug: call, ...(panelId === undefined ? {} : { panelId }) }
}
