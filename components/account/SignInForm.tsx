'use client'

import { signIn } from 'next-auth/react'
import { useRouter } from 'next/navigation'
import { useEffect } from 'react'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { ActionResult } from '@/lib/actions/result'
import { signInSchema } from '@/lib/domain/people/schema'
import { onFillSignIn } from './fillSignIn'

const pair = 'This address and password do not go together.'

// next-auth has its own protocol; its answer is put into the shape of every other form's.
async function trySignIn(values: { email: string; password: string }): Promise<ActionResult<null>> {
  const answer = await signIn('credentials', { ...values, redirect: false })
  if (answer?.ok && !answer.error) return { ok: true, data: null }
  const message = answer?.error ?? 'Signing in failed. Try again.'
  return { ok: false, kind: 'invalid', message, fieldErrors: message === pair ? { password: message } : {} }
}

/** Address and password; then on to the page that was asked for. */
export function SignInForm({ next }: { next: string }) {
  const router = useRouter()
  const form = useActionForm({
    schema: signInSchema,
    action: trySignIn,
    defaultValues: { email: '', password: '' },
    onDone: () => {
      router.push(next)
      router.refresh()
    },
  })
  const { setValue } = form.form
  useEffect(
    () =>
      onFillSignIn(({ email, password }) => {
        setValue('email', email)
        setValue('password', password)
        document.querySelector<HTMLButtonElement>('#main button[type="submit"]')?.focus()
      }),
    [setValue],
  )
  return (
    <ActionForm form={form}>
      <TextField name="email" label="E-mail" type="email" autoComplete="username" inputMode="email" />
      <TextField name="password" label="Password" type="password" autoComplete="current-password" />
      <SubmitButton busyWord="Signing in">Sign in</SubmitButton>
    </ActionForm>
  )
}
