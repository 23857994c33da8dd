import type { NextRequest } from 'next/server'
import NextAuth from 'next-auth'
import { authOptions } from '@/lib/auth/authOptions'

interface AuthRoute {
  params: Promise<{ nextauth: string[] }>
}

// The one handler not made by defineRoute: next-auth brings its own protocol and checks.
async function handler(request: NextRequest, route: AuthRoute): Promise<Response> {
  return (await NextAuth(request, route, authOptions())) as Response
}

export { handler as GET, handler as POST }
