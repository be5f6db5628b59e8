import NextAuth from 'next-auth'
import { authOptions } from '@/lib/auth'

type Context = { params: Promise<{ nextauth: string[] }> }

const handler = (request: Request, context: Context) =>
  (NextAuth(authOptions()) as (request: Request, context: Context) => Promise<Response>)(
    request,
    context,
  )

export { handler as GET, handler as POST }
