import { z } from 'zod'

const number = z.number().finite()

/** Parameters of a cosmology as stored with a proposal; whether such a universe exists is for the engine to say. */
export const cosmologySchema = z.object({
  name: z.string().min(1).max(60),
  H0: number,
  Om0: number,
  Ode0: z.union([number, z.literal('flat')]),
  w0: number,
  wa: number,
  Tcmb0: number,
  Neff: number,
  mNuEv: z.array(number).max(10),
})
