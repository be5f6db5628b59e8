import { areBeside, isNamed, isSaid, said, sureOf, type Sense } from './reply-sense'

/** How sure the text says that the wrong phone was reached; 0 when it does not. */
export function wrongNumberSureness(sense: Sense): number {
  const wrong = said(sense, 'wrongNumber')
  if (wrong.length > 0) return sureOf(0.9, wrong)
  const mistaken = said(sense, 'mistaken')
  if (areBeside(sense, mistaken, said(sense, 'phone', 'person', 'texts'), 2)) {
    return sureOf(0.8, mistaken)
  }
  // "My name is Otieno, you are mistaken"; "this phone was hers, she sold it to me".
  const isOwnName = sense.tokens.some((token) => introWords.has(token.text))
  if (mistaken.length > 0 && isOwnName) return 0.7
  if (isSaid(sense, 'phone') && isSaid(sense, 'gave') && !isNamed(sense, 'filter')) return 0.65
  if (deniesName(sense) || deniesPhone(sense) || namesOwner(sense)) return 0.7
  if (isElsewhereReached(sense) || isNobodyHere(sense) || isOfAnother(sense)) return 0.65
  // "Who are you? I have no filter": alone either may be of a household.
  const hasNone = areBeside(sense, said(sense, 'lack', 'not'), said(sense, 'filter'), 2)
  if (isSaid(sense, 'who') && hasNone) return 0.75
  // "Who is this?" may be a forgotten programme or a stranger: a person answers.
  return isSaid(sense, 'who') ? 0.5 : 0
}

/** "This is not Maria", "no soy Juan", "ami Rahim na": a name stands beside a denial. */
function deniesName(sense: Sense): boolean {
  const denials = sense.marks.filter((mark) =>
    ['not', 'notAround', 'notBack', 'notPlus'].includes(mark.concept),
  )
  return denials.some((denial) => {
    const isBack = denial.concept === 'notBack'
    const isShort = sense.words <= 3 && said(sense, 'name').length > 0
    // "Ami Rahima apa na".
    const isTitled = said(sense, 'greeting').some((mark) => mark.from === denial.from - 1)
    const named = isTitled ? denial.from - 2 : denial.from - 1
    if (isBack) return isName(sense, named) && hasSelf(sense, named)
    const isCopula = isSelf(sense, denial.to)
    const at = isCopula ? denial.to + 1 : denial.to
    return (
      isName(sense, afterTitle(sense, at)) && (isCopula || isShort || hasSelf(sense, denial.to))
    )
  })
}

/** "This is a hardware shop". */
function isElsewhereReached(sense: Sense): boolean {
  if (isNamed(sense, 'filter', 'water', 'need', 'flow')) return false
  return said(sense, 'business').some(
    (mark) =>
      isSaid(sense, 'phone', 'explain', 'texts') ||
      [1, 2, 3].some((back) => isThisWord(sense, mark.from - back)),
  )
}

/** "This is Pastor Ben's line": of this phone another owner is told. */
function isOfAnother(sense: Sense): boolean {
  if (isNamed(sense, 'filter', 'water', 'need', 'flow', 'moved')) return false
  return said(sense, 'phone').some((phone) => {
    const backs = [2, 3, 4, 5].filter((back) => isThisWord(sense, phone.from - back))
    const from = phone.from - Math.min(...backs)
    const owner = sense.tokens.slice(from, phone.from).map((token) => token.text)
    return backs.length > 0 && !owner.some((word) => ownWords.has(word))
  })
}

const ownWords = new Set(
  'my our mi mis mon ma nuestro notre amar amader আমার আমাদের new nuevo nouveau notun নতুন'.split(
    ' ',
  ),
)

/** "No Mama Asha here". */
function isNobodyHere(sense: Sense): boolean {
  const denials = sense.marks.filter((mark) => ['not', 'notNext'].includes(mark.concept))
  const isDesk = isNamed(sense, 'filter', 'water', 'flow', 'broken', 'leak', 'ill', 'problem')
  if (isDesk || sense.words > 8) return false
  return sense.tokens.some(
    (token, at) =>
      hereWords.has(token.text) &&
      denials.some((denial) => denial.to <= at && at - denial.to <= 3 && at - denial.to > 0),
  )
}

const introWords = new Set('name llamo appelle nam নাম'.split(' '))

const hereWords = new Set('here aqui aca ici ekhane এখানে'.split(' '))

/** "This number is not hers", "ce numéro n'est pas celui de …", "eta … number na". */
function deniesPhone(sense: Sense): boolean {
  const denials = sense.marks.filter((mark) =>
    ['not', 'notAround', 'notBack', 'notPlus', 'lack'].includes(mark.concept),
  )
  return said(sense, 'phone').some((phone) => {
    const isThis = [1, 2, 3].some((back) => isThisWord(sense, phone.from - back))
    const isDenied = denials.some(
      (denial) => denial.from >= phone.to && denial.from - phone.to <= 2,
    )
    return isThis && isDenied
  })
}

/** "This is John's phone", "es el teléfono de Juan". */
function namesOwner(sense: Sense): boolean {
  return areBeside(sense, said(sense, 'name'), said(sense, 'phone'), 1)
}

function isThisWord(sense: Sense, at: number): boolean {
  const token = sense.tokens[at]
  return token?.kind === 'word' && thisWords.has(token.text)
}

const thisWords = new Set(
  'this that este esta esto ese ce cet ici ei eta eita ita এই এটা এইটা'.split(' '),
)

/** "La señora", "Mrs", "madame". */
function afterTitle(sense: Sense, at: number): number {
  const token = sense.tokens[at]
  if (token?.kind !== 'word' || !titles.has(token.text)) return at
  return afterTitle(sense, at + 1)
}

const titles = new Set(
  'la el le l familia famille family mr mrs ms miss madam madame monsieur mme senor senora senorita don dona doctor the'.split(
    ' ',
  ),
)

function isName(sense: Sense, at: number): boolean {
  if (sense.tokens[at]?.kind !== 'word') return false
  const marks = sense.marks.filter((mark) => mark.from <= at && at < mark.to)
  if (marks.some((mark) => mark.concept === 'name')) return true
  return sense.unknownAt.includes(at) && isAlmostLast(sense, at)
}

/** A strange word in the middle of a sentence is more likely a verb nobody here knows. */
function isAlmostLast(sense: Sense, at: number): boolean {
  const manners = said(sense, 'thanks', 'please', 'greeting', 'helpWord')
  const isManners = (place: number): boolean =>
    manners.some((mark) => mark.from <= place && place < mark.to)
  const end = sense.tokens.findIndex((token, place) => place > at && token.kind === 'break')
  const places = sense.tokens.map((_, place) => place).slice(at + 1, end === -1 ? undefined : end)
  return places.filter((place) => !isManners(place)).length <= 1
}

function hasSelf(sense: Sense, before: number): boolean {
  return [1, 2, 3].some((back) => isSelf(sense, before - back))
}

function isSelf(sense: Sense, at: number): boolean {
  const token = sense.tokens[at]
  return token?.kind === 'word' && selfWords.has(token.text)
}

/** "I am", "this is" in the four languages, as the tokens stand. */
const selfWords = new Set(
  'im i am this is its isnt soy es esta este estas ese suis c est moi je ami amar ei eta আমি আমার এটা এই'.split(
    ' ',
  ),
)
