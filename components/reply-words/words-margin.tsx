import type { Language } from '@/lib/domain/language'
import { MarginBlock } from '../ui/margin-block'
import { LanguageChoice } from './language-choice'

/** Beside the words: which language is open, where things stand, and what becomes of a word. */
export function WordsMargin({ language }: { language: Language }) {
  return (
    <>
      <MarginBlock title="Language">
        <LanguageChoice language={language} />
      </MarginBlock>
      <div className="mt-4.5 border-t border-rule pt-3 max-lg:hidden">
        <MarginBlock title="On this page">
          <ul>
            {places.map(([id, name]) => (
              <li key={id} className="py-0.5">
                <a href={`#${id}`} className="plain-link decoration-rule">
                  {name}
                </a>
              </li>
            ))}
          </ul>
        </MarginBlock>
        <MarginBlock title="What becomes of a word">
          <p>
            Nothing is learnt by itself. A word that you add counts from the next text on, in its
            own language. What was read before stays as it was read.
          </p>
          <p className="mt-2">
            Denials, small words of grammar and the ways of ending the texts came with the desk and
            are not changed here.
          </p>
        </MarginBlock>
      </div>
    </>
  )
}

const places = [
  ['proposals', 'Proposals'],
  ['try', 'Try a text'],
  ['added', 'Added by the programme'],
  ['words', 'The words'],
] as const
