'use client'

import { useState } from 'react'
import type { CycleLengths } from '@/lib/domain/cycle-words'
import type { WhatIfAnswer } from '@/lib/schemas/what-if'
import { getJson } from '../api'
import { useEntry } from '../entry/use-entry'
import { Button } from '../ui/button'
import { Notice } from '../ui/notice'
import { WhatIfAnswered } from './what-if-answered'
import { WhatIfFields } from './what-if-fields'

/** The fields that were filled in, as a query: an empty one leaves its cycle as it stands. */
function queryOf(form: FormData): string {
  const filled = [...form].flatMap(([name, value]) =>
    typeof value === 'string' && value.trim() !== '' ? [[name, value.trim()]] : [],
  )
  return new URLSearchParams(filled).toString()
}

/** Tries other cycles against the kits in use, beside those that stand. Nothing is kept. */
export function WhatIf({ standing }: { standing: CycleLengths }) {
  const [answer, setAnswer] = useState<WhatIfAnswer | null>(null)
  const entry = useEntry({
    send: (form) => getJson<WhatIfAnswer>(`/api/rounds/what-if?${queryOf(form)}`),
    onKept: setAnswer,
  })
  return (
    <section aria-labelledby="what-if" className="mt-14">
      <h2
        id="what-if"
        className="scroll-mt-4 border-b border-ink pb-1.5 font-title text-lg font-semibold"
      >
        What if
      </h2>
      <p className="mt-1 max-w-reading text-sm text-faint">
        Other cycles, tried on the kits in use beside the cycles that stand. Nothing is kept.
      </p>
      <form onSubmit={entry.onSubmit} noValidate className="mt-5 grid gap-6">
        <WhatIfFields standing={standing} wrong={entry.wrong} />
        {entry.reason && <Notice tone="danger" title={entry.reason} live />}
        <div>
          <Button kind="main" type="submit" busy={entry.busy}>
            {entry.busy ? 'Working it out …' : 'Work it out'}
          </Button>
        </div>
      </form>
      <p role="status" className="sr-only">
        {answer && 'Worked out: the answer is below.'}
      </p>
      {answer && <WhatIfAnswered answer={answer} />}
    </section>
  )
}
