'use client'

import { useRouter } from 'next/navigation'
import type { DefaultValues, FieldValues } from 'react-hook-form'
import type { z } from 'zod'
import { useActionForm } from '@/components/forms/useActionForm'

/** A form whose answer is an address: what was asked stands in it, so that a link reproduces the page. */
export function useToolForm<Input extends FieldValues, Output>(
  path: string,
  schema: z.ZodType<Output, Input>,
  defaultValues: DefaultValues<Input>,
) {
  const router = useRouter()
  return useActionForm<Input, Output, null>({
    schema,
    defaultValues,
    action: async (values) => {
      router.push(`${path}?${new URLSearchParams(values as Record<string, string>)}`, { scroll: false })
      return { ok: true, data: null }
    },
  })
}
