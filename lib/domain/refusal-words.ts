const words: Record<string, string> = {
  'taken by another': 'A colleague has this ticket.',
  'not open': 'This ticket has ended.',
  'nothing promised': 'No part is promised to this household.',
  'no visit due': 'No visit is due.',
  'unknown step': 'There is no such step.',
  'no depot has this part': 'No depot has this part. The coordinator has been told.',
  'this stage has a promise already': 'This stage has a promise already.',
  'this was texted already': 'This was sent a moment ago.',
}

/** Why the core refused, in words for who pressed the button. */
export function refusalWords(reason: string): string {
  return words[reason] ?? reason
}
