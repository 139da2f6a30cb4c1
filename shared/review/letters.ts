/**
 * The letters of formal issues. I, O, Q, S, X and Z are skipped because they
 * are misread on drawings (common practice); after Y comes AA.
 */
const LETTERS = 'ABCDEFGHJKLMNPRTUVWY'

export const FIRST_LETTER = 'A'

/** Whether the text is an issue letter of the series. */
export const isLetter = (text: string): boolean => text !== '' && [...text].every(character => LETTERS.includes(character))

/** Place in the series: A is 1, Y is 20, AA is 21. @throws RangeError for text that is not of the series */
export function letterRank(letter: string): number {
  if (!isLetter(letter)) throw new RangeError(`${letter} is not an issue letter`)
  return [...letter].reduce((rank, character) => rank * LETTERS.length + LETTERS.indexOf(character) + 1, 0)
}

function letterAt(rank: number): string {
  const place = (rank - 1) % LETTERS.length
  const before = (rank - 1 - place) / LETTERS.length
  return (before > 0 ? letterAt(before) : '') + LETTERS.charAt(place)
}

/** The letter after the one given: A → B, H → J, Y → AA. @throws RangeError for text that is not of the series */
export const nextLetter = (letter: string): string => letterAt(letterRank(letter) + 1)

/** Sorts letters as the issues follow each other. */
export const compareLetters = (a: string, b: string): number => letterRank(a) - letterRank(b)
