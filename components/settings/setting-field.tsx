'use client'

import { useState } from 'react'
import { boundsWords, percentOf, type SettingInfo } from '@/lib/domain/setting-catalogue'
import type { SettingPath, SettingValue } from '@/lib/domain/settings'
import { Button } from '../ui/button'
import { Choice } from '../ui/choice-field'
import { TextField } from '../ui/field'

type SettingFieldProps = {
  path: SettingPath
  info: SettingInfo
  value: SettingValue
  /** What holds where nothing is set. */
  standard: SettingValue
  error: string | undefined
}

/** One that is on or off. */
function SwitchField({ path, info, value, standard }: Omit<SettingFieldProps, 'error'>) {
  const [isOn, setOn] = useState(value === true)
  const usual = standard === true ? 'on' : 'off'
  return (
    <Choice
      name={path}
      value="on"
      checked={isOn}
      onChange={(event) => setOn(event.target.checked)}
      label={info.label}
      className="sm:col-span-2"
      hint={isOn === standard ? `${usual}: the default` : `the default is ${usual}`}
    />
  )
}

/** A value as it is written in its field. */
function written(info: SettingInfo, value: SettingValue): string {
  return String(info.kind === 'share' ? percentOf(Number(value)) : value)
}

function unitOf(info: SettingInfo): string | null {
  if (info.kind === 'share') return '%'
  return info.kind === 'number' ? info.unit : null
}

/** One setting: its unit, bounds and source, and a way back to its default. */
export function SettingField(props: SettingFieldProps) {
  return props.info.kind === 'switch' ? <SwitchField {...props} /> : <WrittenField {...props} />
}

function WrittenField({ path, info, value, standard, error }: SettingFieldProps) {
  const [text, setText] = useState(written(info, value))
  const usual = written(info, standard)
  const unit = unitOf(info)
  return (
    <div className="self-end">
      <TextField
        name={path}
        value={text}
        onChange={(event) => setText(event.target.value)}
        mono={info.kind !== 'text'}
        inputMode={info.kind === 'text' ? 'text' : 'decimal'}
        label={
          <>
            {info.label}
            {unit && <span className="font-normal text-faint">, {unit}</span>}
          </>
        }
        hint={`${boundsWords(info)} ${info.source}`}
        error={error}
        beside={
          <span className="w-2/5 shrink-0 text-sm text-faint">
            {text.trim() === usual ? (
              'default'
            ) : (
              <Button kind="quiet" size="small" onClick={() => setText(usual)}>
                Back to {usual}
              </Button>
            )}
          </span>
        }
      />
    </div>
  )
}
