import { describe, expect, it } from 'vitest'
import { mayMeanStop } from '@/lib/domain/reply-stop'

describe('words that may ask to stop or tell of a stop', () => {
  it.each([
    'it stopped',
    'STOPPED!',
    'se paró',
    'dejó de salir',
    "s'est arrêté",
    'arrêtez',
    'বন্ধ হয়ে গেছে',
    'থেমে গেছে',
    'পানি বন্ধ।',
    'bondho hoye gese',
    'theme gese',
    'para',
  ])('are found in "%s"', (text) => {
    expect(mayMeanStop(text)).toBe(true)
  })

  it.each([
    'agua para beber',
    'my shop is open',
    'la parte de arriba',
    'থাকি না',
    'department',
    'el agua sale lento para todos',
  ])('are not found in "%s"', (text) => {
    expect(mayMeanStop(text)).toBe(false)
  })
})
