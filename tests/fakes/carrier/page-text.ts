const escapes: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
}

export function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (letter) => escapes[letter] ?? letter)
}

/** `+12125550100` as one reads it aloud; numbers of other countries stay as they are. */
export function spacedNumber(number: string): string {
  const parts = /^\+1(\d{3})(\d{3})(\d{4})$/.exec(number)
  return parts ? `+1 ${parts[1]} ${parts[2]}-${parts[3]}` : number
}

export type PhoneTime = { day: string; hour: string }

/** Day and hour as the phone's own clock shows them. */
export function phoneTime(at: number, timeZone: string): PhoneTime {
  const zone = isZone(timeZone) ? { timeZone } : {}
  return {
    day: new Intl.DateTimeFormat('en-GB', {
      weekday: 'short',
      day: 'numeric',
      month: 'short',
      ...zone,
    }).format(at),
    hour: new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', ...zone }).format(
      at,
    ),
  }
}

function isZone(timeZone: string): boolean {
  if (timeZone === '') return false
  try {
    new Intl.DateTimeFormat('en-GB', { timeZone })
    return true
  } catch {
    return false
  }
}

export const languageNames: Record<string, string> = {
  en: 'English',
  es: 'Spanish',
  fr: 'French',
  bn: 'Bengali',
}

/** The page with these phones open, one after another. */
export function pageAddress(open: readonly string[]): string {
  if (open.length === 0) return '/'
  return `/?${new URLSearchParams(open.map((number) => ['open', number]))}`
}
