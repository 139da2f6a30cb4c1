/** Names that are still free: of walls by letters, of nodes, cases and materials by numbers. */

/** a, b, … z, then aa, ab: the first that no wall bears. */
export function nextLetters(used: readonly string[]): string {
  for (let n = 0; ; n++) {
    const letters = n < 26 ? letter(n) : letter(Math.floor(n / 26) - 1) + letter(n % 26)
    if (!used.includes(letters)) return letters
  }
}
const letter = (n: number) => String.fromCharCode(97 + n)

/** `prefix` and the first number that is free. */
export function nextNumbered(prefix: string, used: readonly string[], digits = 1): string {
  for (let n = 1; ; n++) {
    const id = `${prefix}${String(n).padStart(digits, '0')}`
    if (!used.includes(id)) return id
  }
}
