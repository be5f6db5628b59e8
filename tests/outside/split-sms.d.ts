/** The one function of split-sms, which ships no types. */
declare module 'split-sms' {
  export function split(text: string): { characterSet: 'GSM' | 'Unicode'; parts: unknown[] }
}
