import { tokenise } from './reply-tokens'

/** Words of the desk's languages that ask to stop and also say that something stopped, folded. */
const stopping =
  /^(?:stop(?:s|ped|ed|ping|per|pez|pe)?|arr?et\p{L}*|par(?:o|e|en|ar|ado|ada|aron)|dej(?:o|a|e|en|aron)|detuv\p{L}*|deten\p{L}*|bond?h?o|tham\p{L}*|theme|বন্ধ\p{L}*|থাম[\p{L}\p{M}]*|থেমে)$/u

/** True if the words could mean either "stop texting" or "the water stopped": the desk asks. */
export function mayMeanStop(text: string): boolean {
  // Spanish "para" is "for" unless it stands alone.
  const words = tokenise(text).filter((token) => token.kind === 'word')
  const isPara = words[0]?.text === 'para' && words.length <= 2
  return isPara || words.some((word) => stopping.test(word.text))
}
