import { describe, expect, it } from 'vitest'
import { compareLetters, isLetter, letterRank, nextLetter } from '#shared/review/letters'

describe('issue letters', () => {
  // The series written out by hand: the Latin alphabet without I, O, Q, S, X, Z (common practice).
  const series = ['A', 'B', 'C', 'D', 'E', 'F', 'G', 'H', 'J', 'K', 'L', 'M', 'N', 'P', 'R', 'T', 'U', 'V', 'W', 'Y', 'AA', 'AB']

  it('follow each other without the letters that are misread', () => {
    for (const [index, letter] of series.slice(0, -1).entries()) expect(nextLetter(letter)).toBe(series[index + 1])
  })

  it.each([['AY', 'BA'], ['AH', 'AJ'], ['YY', 'AAA']])('%s is followed by %s', (letter, next) => {
    expect(nextLetter(letter)).toBe(next)
  })

  it.each(['', 'I', 'O', 'Q', 'S', 'X', 'Z', 'AO', 'a', '1', 'A '])('refuses %j', (text) => {
    expect(isLetter(text)).toBe(false)
    expect(() => letterRank(text)).toThrow(RangeError)
  })

  it('never repeats and keeps its order over a thousand issues', () => {
    const seen = new Set<string>()
    let letter = 'A'
    for (let rank = 1; rank <= 1000; rank++) {
      expect(letterRank(letter)).toBe(rank)
      expect(seen.has(letter)).toBe(false)
      seen.add(letter)
      const next = nextLetter(letter)
      expect(compareLetters(letter, next)).toBeLessThan(0)
      letter = next
    }
  })
})
