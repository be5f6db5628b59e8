import type { ReactNode } from 'react'

/** A key to press. */
export function Kbd({ children }: { children: ReactNode }) {
  return (
    <kbd className="border border-rule bg-sheet px-1.5 py-px font-mono text-xs font-medium">
      {children}
    </kbd>
  )
}

type KeysProps = { keys: readonly { press: readonly string[]; does: string }[] }

/** The line at a sheet's foot that lists its keys; no use where there is no keyboard. */
export function Keys({ keys }: KeysProps) {
  return (
    <p className="mt-7 flex flex-wrap gap-x-4 gap-y-1 pl-lead text-sm text-faint print:hidden pointer-coarse:hidden">
      {keys.map(({ press, does }) => (
        <span key={does} className="whitespace-nowrap">
          {press.map((key) => (
            <span key={key}>
              <Kbd>{key}</Kbd>{' '}
            </span>
          ))}
          {does}
        </span>
      ))}
    </p>
  )
}
