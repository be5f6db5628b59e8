import { getToken } from 'next-auth/jwt'
import { NextResponse, type NextRequest } from 'next/server'
import { env, isDevelopment } from './lib/env'

function policy(nonce: string): string {
  const development = isDevelopment()
  return [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${development ? " 'unsafe-eval'" : ''}`,
    development ? "style-src 'self' 'unsafe-inline'" : `style-src 'self' 'nonce-${nonce}'`,
    "img-src 'self' blob: data:",
    "font-src 'self'",
    "connect-src 'self'",
    "object-src 'none'",
    "base-uri 'self'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ')
}

/** First gate of every page: nobody without a session goes on, and scripts need this answer's nonce. */
export async function proxy(request: NextRequest): Promise<NextResponse> {
  const { pathname } = request.nextUrl
  const isOpen = pathname === '/sign-in' || pathname.startsWith('/k/')
  if (!isOpen && !(await getToken({ req: request, secret: env().sessionSecret }))) {
    const door = new URL('/sign-in', request.url)
    if (pathname !== '/') door.searchParams.set('from', pathname)
    return NextResponse.redirect(door)
  }
  const nonce = Buffer.from(crypto.randomUUID()).toString('base64')
  const headers = new Headers(request.headers)
  headers.set('x-nonce', nonce)
  headers.set('content-security-policy', policy(nonce))
  const response = NextResponse.next({ request: { headers } })
  response.headers.set('content-security-policy', policy(nonce))
  return response
}

export const config = {
  matcher: [
    {
      source: '/((?!api|_next/static|_next/image|icon.svg|favicon.ico).*)',
      missing: [
        { type: 'header', key: 'next-router-prefetch' },
        { type: 'header', key: 'purpose', value: 'prefetch' },
      ],
    },
  ],
}
