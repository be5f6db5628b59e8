/**
 * The line of water that runs down a sheet. Its parent is positioned and starts at the window's
 * left edge, so that the line meets the one under the wordmark.
 */
export function FallLine() {
  return <span aria-hidden className="absolute inset-y-0 left-fall -ml-px w-0.5 bg-water" />
}

/** Makes the line broken from below a bead to the foot of its parent: a person is waited for. */
export function FallDashes() {
  return (
    <span
      aria-hidden
      className="absolute top-7 -bottom-3.5 left-fall -ml-px w-0.5 fall-dashed print:hidden"
    />
  )
}
