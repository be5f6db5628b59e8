import type { ComponentProps, ReactNode } from 'react'
import { useId } from 'react'

type Around = {
  label: ReactNode
  /** A line under the label: how to write it, or why it is asked. */
  hint?: ReactNode
  /** What is wrong with what was entered, in words. */
  error?: string | undefined
  /** Said in the label: everything else is needed. */
  optional?: boolean
}

const control =
  'block w-full min-h-11 rounded-paper border-[1.5px] bg-sheet px-3 py-2 text-ink placeholder:text-faint disabled:bg-transparent disabled:text-faint'

function controlClass(error: string | undefined, extra = ''): string {
  return `${control} ${error ? 'border-clay' : 'border-faint'} ${extra}`
}

type Ids = { id: string; hintId: string; errorId: string }

function useFieldIds(): Ids {
  const id = useId()
  return { id, hintId: `${id}-hint`, errorId: `${id}-error` }
}

function described(ids: Ids, { hint, error }: Around) {
  const by = [hint ? ids.hintId : '', error ? ids.errorId : ''].filter(Boolean).join(' ')
  return { 'aria-describedby': by || undefined, 'aria-invalid': error ? true : undefined }
}

/** The words of what is wrong, with a mark so that colour is not all that says so. */
export function FieldError({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <p id={id} className="mt-1.5 border-l-2 border-clay pl-2 text-sm font-semibold text-clay">
      {children}
    </p>
  )
}

function Labelled({ ids, around, children }: { ids: Ids; around: Around; children: ReactNode }) {
  const { label, hint, error, optional } = around
  return (
    <div>
      <label htmlFor={ids.id} className="block font-semibold">
        {label}
        {optional && <span className="font-normal text-faint"> (optional)</span>}
      </label>
      {hint && (
        <p id={ids.hintId} className="text-sm text-faint">
          {hint}
        </p>
      )}
      <div className="mt-1.5">{children}</div>
      {error && <FieldError id={ids.errorId}>{error}</FieldError>}
    </div>
  )
}

type TextFieldProps = Around &
  ComponentProps<'input'> & {
    mono?: boolean
    /** Stands at the right of what is written. */
    beside?: ReactNode
  }

/** One line to write in. `mono` for numbers, phone numbers and texts. */
export function TextField({ label, hint, error, optional, mono, ...input }: TextFieldProps) {
  const ids = useFieldIds()
  const around = { label, hint, error, optional }
  const { className, beside, ...attributes } = input
  const control = (
    <input
      required={!optional}
      {...attributes}
      {...described(ids, around)}
      id={ids.id}
      className={controlClass(error, `${mono ? 'font-mono' : ''} ${className ?? ''}`)}
    />
  )
  return (
    <Labelled ids={ids} around={around}>
      {beside ? (
        <div className="flex items-center gap-3">
          {control}
          {beside}
        </div>
      ) : (
        control
      )}
    </Labelled>
  )
}

type AreaFieldProps = Around & ComponentProps<'textarea'> & { mono?: boolean }

/** Several lines to write in. */
export function AreaField({ label, hint, error, optional, mono, ...area }: AreaFieldProps) {
  const ids = useFieldIds()
  const around = { label, hint, error, optional }
  const { className, ...attributes } = area
  return (
    <Labelled ids={ids} around={around}>
      <textarea
        rows={4}
        required={!optional}
        {...attributes}
        {...described(ids, around)}
        id={ids.id}
        className={controlClass(error, `leading-6 ${mono ? 'font-mono' : ''} ${className ?? ''}`)}
      />
    </Labelled>
  )
}

type SelectFieldProps = Around & ComponentProps<'select'>

/** One of a list; the options are its children. */
export function SelectField({ label, hint, error, optional, ...select }: SelectFieldProps) {
  const ids = useFieldIds()
  const around = { label, hint, error, optional }
  const { className, ...attributes } = select
  return (
    <Labelled ids={ids} around={around}>
      <select
        required={!optional}
        {...attributes}
        {...described(ids, around)}
        id={ids.id}
        className={controlClass(error, className)}
      />
    </Labelled>
  )
}
