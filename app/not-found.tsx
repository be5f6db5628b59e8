import type { Metadata } from 'next'
import { Door } from '@/components/door/door'
import { ButtonLink } from '@/components/ui/button'

export const metadata: Metadata = { title: 'Not here' }

export default function NotFound() {
  return (
    <Door>
      <h1 className="font-title text-3xl font-semibold tracking-[-0.01em]">
        There is no such sheet
      </h1>
      <p className="mt-1 mb-6 text-faint">
        The address may be mistyped, or what it showed was erased at a household’s wish.
      </p>
      <ButtonLink href="/" kind="main">
        Back to the desk
      </ButtonLink>
    </Door>
  )
}
