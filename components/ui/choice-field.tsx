import type { ComponentProps, ReactNode } from 'react'
import { FieldError } from './field'

type ChoiceProps = ComponentProps<'input'> & { label: ReactNode; hint?: ReactNode }

/** A box to tick, or with `type="radio"` one of a set; the whole line is the target. */
export function Choice({ label, hint, type = 'checkbox', className, ...input }: ChoiceProps) {
  return (
    <label className={`flex min-h-11 items-start gap-3 py-2.5 ${className ?? ''}`}>
      <input {...input} type={type} className="mt-0.5 size-5 shrink-0 accent-ink" />
      <span>
        {label}
        {hint && <span className="block text-sm text-faint">{hint}</span>}
      </span>
    </label>
  )
}

type FieldGroupProps = {
  legend: ReactNode
  hint?: ReactNode
  error?: string | undefined
  children: ReactNode
}

/** Fields or choices that belong together, under one name. */
export function FieldGroup({ legend, hint, error, children }: FieldGroupProps) {
  return (
    <fieldset>
      <legend className="font-semibold">{legend}</legend>
      {hint && <p className="text-sm text-faint">{hint}</p>}
      <div className="mt-1">{children}</div>
      {error && <FieldError>{error}</FieldError>}
    </fieldset>
  )
}
