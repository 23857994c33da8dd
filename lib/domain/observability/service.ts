/** Standard the query follows, as the draft has it registered. */
export const queryStandard = 'ivo://ivoa.net/std/ObjObsSAP#query-0.3'

/** Where a resource of the service lies. */
export const serviceAddress = (origin: string, resource: 'query' | 'availability' | 'capabilities'): string =>
  `${origin}/api/vo/observability/${resource}`
