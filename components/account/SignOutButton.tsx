'use client'

import { signOut } from 'next-auth/react'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { paths } from '@/lib/paths'

/** Ends this session on the server, then goes to the front page. */
export function SignOutButton() {
  return <LinkLikeButton onClick={() => void signOut({ callbackUrl: paths.home() })}>Sign out</LinkLikeButton>
}
