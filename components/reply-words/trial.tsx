'use client'

import Link from 'next/link'
import type { TriedReply } from '@/lib/schemas/reply-words'
import { Button } from '../ui/button'
import { Notice } from '../ui/notice'
import { MarkWords } from './mark-words'
import { MarkedText } from './marked-text'
import { useTrial, type Trial, type TrialText } from './use-trial'
import { WordEffect } from './word-effect'

/** A text as the desk reads it, on which words can be given a meaning. */
export function TextTrial(props: TrialText) {
  const trial = useTrial(props)
  const { tried, words, done } = trial
  const isOver = done !== null && props.proposal !== undefined
  return (
    <>
      {tried && <Reading tried={tried} trial={trial} language={props.language} />}
      {!isOver && <MarkWords text={props.text} language={props.language} trial={trial} />}
      {words.length > 0 && tried?.effect && (
        <WordEffect effect={tried.effect} language={props.language} />
      )}
      <TrialNews trial={trial} language={props.language} />
      {!isOver && <TrialActions trial={trial} isProposal={props.proposal !== undefined} />}
    </>
  )
}

type ReadingProps = { tried: TriedReply; trial: Trial; language: TrialText['language'] }

function Reading({ tried, trial, language }: ReadingProps) {
  const { reading, unknownWords } = tried
  const withWords = trial.words.length > 0 ? 'With these words the desk reads' : 'The desk reads'
  return (
    <section aria-label="As the desk reads it" aria-busy={trial.isTrying}>
      <p role="status" className="mb-2">
        {withWords}: <strong className="font-semibold">{reading.meaning}</strong>,{' '}
        <span className="text-faint">{reading.sure}</span>.
      </p>
      <MarkedText tried={tried} language={language} />
      <Readers tried={tried} />
      {unknownWords.length > 0 && (
        <p className="mt-1.5 text-sm text-faint">
          Words it does not know:{' '}
          <span lang={language} className="font-mono">
            {unknownWords.join(', ')}
          </span>
        </p>
      )}
    </section>
  )
}

/** The two readers apart: where they differ a person is asked. */
function Readers({ tried: { byWords, byExamples } }: { tried: TriedReply }) {
  const shares = byExamples.map(({ meaning, percent }) => `${meaning} ${percent} %`)
  return (
    <p className="mt-1.5 text-sm text-faint">
      By the word lists: {byWords}. By texts like it: {shares.join(', ')}.
    </p>
  )
}

function TrialNews({ trial, language }: { trial: Trial; language: TrialText['language'] }) {
  const { done, error } = trial
  if (error) {
    return (
      <Notice tone="danger" title="Not done" live className="mt-5">
        {error.message}
      </Notice>
    )
  }
  if (!done) return null
  return (
    <Notice tone="good" live className="mt-5">
      <p>
        {done === 'added'
          ? 'Added. The desk reads so from the next text on; what was read before stays as it was.'
          : 'Set aside. No word was added.'}
      </p>
      <p>
        <Link href={`/reply-words?language=${language}`} className="plain-link">
          All reply words
        </Link>
      </p>
    </Notice>
  )
}

function TrialActions({ trial, isProposal }: { trial: Trial; isProposal: boolean }) {
  const { words, tried, isTrying, busy, settle } = trial
  if (words.length === 0 && !isProposal) return null
  const isRefused = (tried?.refused.length ?? 0) > 0
  return (
    <div className="mt-5 flex flex-wrap items-center gap-3">
      {isRefused && (
        <p className="w-full text-sm text-faint">Take off what may not be added first.</p>
      )}
      <Button
        kind="main"
        busy={busy}
        disabled={words.length === 0 || isRefused || isTrying}
        onClick={() => settle('added')}
      >
        {words.length > 1 ? 'Add these words' : 'Add this word'}
      </Button>
      {isProposal && (
        <Button kind="quiet" busy={busy} onClick={() => settle('set aside')}>
          Set the proposal aside
        </Button>
      )}
    </div>
  )
}
