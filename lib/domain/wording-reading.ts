/**
 * Flesch–Kincaid grade: years of school in the United States that an English text asks for, from
 * its counts. On one text of a few sentences it is unreliable, and it says nothing of any other
 * language: words, sentences and actions are what a draft is checked by.
 */
export function readingGrade({
  sentences,
  words,
  syllables,
}: {
  sentences: number
  words: number
  syllables: number
}): number {
  return 0.39 * (words / sentences) + 11.8 * (syllables / words) - 15.59
}
