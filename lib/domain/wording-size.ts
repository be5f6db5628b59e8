import { SegmentedMessage } from 'sms-segments-calculator'

/** How the carrier counts a text: characters of GSM-7 (septets) or UTF-16 (units), in parts. */
export function segmentsOf(text: string): {
  encoding: 'GSM-7' | 'UCS-2'
  segments: number
  units: number
} {
  if (text === '') return { encoding: 'GSM-7', segments: 0, units: 0 }
  const counted = new SegmentedMessage(text)
  const encoding = counted.encodingName
  const unitBits = encoding === 'GSM-7' ? 7 : 16
  return { encoding, segments: counted.segmentsCount, units: counted.messageSize / unitBits }
}

/** Room in each part: a text in one part has more, since parts must say where they belong. */
export function unitsPerPart(encoding: 'GSM-7' | 'UCS-2', segments: number): number {
  if (encoding === 'GSM-7') return segments > 1 ? 153 : 160
  return segments > 1 ? 67 : 70
}

/** The characters (each once, in order) that a phone's basic alphabet lacks. */
export function offendingCharacters(text: string): string[] {
  return [...new Set(new SegmentedMessage(text).getNonGsmCharacters())]
}

/** What a text costs, in the currency of the price. */
export function costOf({
  segments,
  pricePerSegment,
}: {
  segments: number
  pricePerSegment: number
}): number {
  return segments * pricePerSegment
}
