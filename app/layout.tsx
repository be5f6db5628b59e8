import type { Metadata, Viewport } from 'next'
import type { ReactNode } from 'react'
import { connection } from 'next/server'
import './globals.css'

export const metadata: Metadata = {
  title: { default: 'Rillpost', template: '%s · Rillpost' },
  description: 'The text desk that keeps household water filters running after hand-out day.',
  robots: { index: false, follow: false },
}

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  colorScheme: 'light dark',
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#f8f7f2' },
    { media: '(prefers-color-scheme: dark)', color: '#0c141e' },
  ],
}

export default async function RootLayout({ children }: { children: ReactNode }) {
  // Every page is dynamic: the script policy carries a nonce per request, and no page may be
  // rendered (and so open the database) while building.
  await connection()
  return (
    <html lang="en">
      <body className="bg-paper font-sans text-base text-ink antialiased">{children}</body>
    </html>
  )
}
