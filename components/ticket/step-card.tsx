'use client'

import { useState } from 'react'
import { languageNamesInEnglish } from '@/lib/domain/language'
import type { Preview, StepView } from '@/lib/schemas/ticket'
import { Button } from '../ui/button'
import { Notice } from '../ui/notice'
import { AnswerButtons } from './answer-buttons'
import { Composer, TextRuler } from './composer'
import { OtherSteps } from './other-steps'
import { OwnWords } from './own-words'
import { TakeIt } from './take-it'
import type { TicketDesk } from './use-ticket'

type Props = { desk: TicketDesk; step: StepView }

/** The step to send now: why, the words as they would go out, and the answers that may come. */
export function StepCard({ desk, step }: Props) {
  const isMine = desk.ticket.holder.kind === 'you'
  return (
    <>
      <p className="text-faint">{step.lead}</p>
      <h2 className="font-title text-xl font-semibold">{step.name}</h2>
      <p className="text-faint">{step.why}</p>
      {step.awaited && <p className="mt-2 text-sm font-semibold">{sentence(step.awaited)}</p>}
      {isMine ? <Sending desk={desk} step={step} /> : <PreviewWords preview={step.preview} />}
      {!isMine && <TakeIt desk={desk} />}
      {isMine && <AnswerButtons desk={desk} step={step} />}
    </>
  )
}

const sentence = (words: string) => `${words[0]?.toUpperCase() ?? ''}${words.slice(1)}.`

function PreviewWords({ preview }: { preview: Preview }) {
  if (!preview.ok) {
    return (
      <Notice tone="danger" title="There are no words for this step yet" className="mt-4">
        {preview.reason}
      </Notice>
    )
  }
  const { text, language, staffText } = preview
  return (
    <div className="mt-4 border-l-2 border-ink pl-3.5">
      <p lang={language} className="font-mono whitespace-pre-line">
        {text}
      </p>
      <p lang="en" className="mt-2 text-sm text-faint">
        {staffText ?? `In ${languageNamesInEnglish[language]}, the staff’s own language.`}
      </p>
    </div>
  )
}

function Sending({ desk, step }: Props) {
  const { preview } = step
  const [own, setOwn] = useState<string | null>(null)
  const text = preview.ok ? preview.text : ''
  const send = () =>
    desk.act({
      name: 'send-step',
      body: { stepId: step.id, ...(own === null || own === text ? {} : { body: own }) },
      said: `Sent: ${step.name.toLowerCase()}.`,
    })
  return (
    <>
      {own === null ? (
        <>
          <PreviewWords preview={preview} />
          {preview.ok && <TextRuler text={preview.text} />}
        </>
      ) : (
        <div className="mt-4">
          <Composer
            label="Words of this step"
            hint={preview.ok ? preview.staffText : null}
            language={preview.ok ? preview.language : 'en'}
            value={own}
            onChange={setOwn}
          />
        </div>
      )}
      <div className="mt-3.5 flex flex-wrap items-center gap-2.5">
        <Button
          kind="main"
          busy={desk.busy}
          disabled={own === null ? !preview.ok : own.trim() === ''}
          onClick={send}
        >
          {step.awaited ? 'Send again' : 'Send'}
        </Button>
        <Button onClick={() => setOwn(own === null ? text : null)}>
          {own === null ? 'Change the words' : 'Leave the words as they were'}
        </Button>
        <OtherSteps desk={desk} />
        <OwnWords desk={desk} />
      </div>
    </>
  )
}
