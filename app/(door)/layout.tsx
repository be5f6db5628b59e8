import type { ReactNode } from 'react'
import { Door } from '@/components/door/door'

export default function DoorLayout({ children }: { children: ReactNode }) {
  return <Door>{children}</Door>
}
