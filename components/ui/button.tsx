import type { ComponentProps } from 'react'
import Link from 'next/link'

type ButtonKind = 'main' | 'line' | 'quiet' | 'danger'
type ButtonSize = 'normal' | 'small'

const shared =
  'inline-flex items-center justify-center gap-2 rounded-paper text-center font-semibold no-underline transition-colors duration-100 disabled:cursor-not-allowed aria-disabled:cursor-not-allowed'

const kinds: Record<ButtonKind, string> = {
  main: 'bg-ink text-paper hover:bg-ink/85 disabled:bg-faint aria-disabled:bg-faint',
  line: 'border-[1.5px] border-ink text-ink hover:bg-ink/8 disabled:border-faint disabled:text-faint disabled:hover:bg-transparent',
  quiet:
    'text-ink underline decoration-[1.5px] underline-offset-4 hover:decoration-water hover:decoration-[2.5px] disabled:text-faint',
  danger:
    'border-[1.5px] border-clay text-clay hover:bg-clay/10 disabled:border-faint disabled:text-faint disabled:hover:bg-transparent',
}

/** Small still grows to 44 px where a finger is the pointer. */
const sizes: Record<ButtonSize, string> = {
  normal: 'min-h-11 px-4.5 py-2.5 text-base',
  small: 'min-h-9 px-3 py-1.5 text-sm pointer-coarse:min-h-11',
}

function buttonClass(kind: ButtonKind, size: ButtonSize, extra = ''): string {
  const room = kind === 'quiet' ? sizes[size].replace(/px-\S+/, 'px-1') : sizes[size]
  return `${shared} ${kinds[kind]} ${room} ${extra}`
}

type ButtonProps = ComponentProps<'button'> & {
  kind?: ButtonKind
  size?: ButtonSize
  /** Under way: cannot be pressed again, keeps its place and its focus. */
  busy?: boolean
}

/** A button; `type="button"` unless told otherwise. */
export function Button({ kind = 'line', size = 'normal', busy, ...rest }: ButtonProps) {
  const { className, onClick, type = 'button', ...attributes } = rest
  return (
    <button
      {...attributes}
      type={busy ? 'button' : type}
      aria-disabled={busy || undefined}
      onClick={busy ? undefined : onClick}
      className={buttonClass(kind, size, className)}
    />
  )
}

type ButtonLinkProps = ComponentProps<typeof Link> & { kind?: ButtonKind; size?: ButtonSize }

/** A link that looks like a button: for going somewhere, not for doing something. */
export function ButtonLink({
  kind = 'line',
  size = 'normal',
  className,
  ...rest
}: ButtonLinkProps) {
  return <Link {...rest} className={buttonClass(kind, size, className)} />
}
