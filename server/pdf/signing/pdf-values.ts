/**
 * Reads the values of a PDF file strictly, in the one spelling that our own
 * writer uses: nothing is skipped, guessed or repaired. Positions are kept, so
 * that a verifier can say which bytes a value is made of.
 */
export type PdfValue
  = | { kind: 'number', value: number }
    | { kind: 'word', value: 'true' | 'false' | 'null' }
    | { kind: 'name', value: string }
    | { kind: 'text', value: string }
    | { kind: 'hex', start: number, end: number }
    | { kind: 'ref', id: number }
    | { kind: 'array', items: PdfValue[], start: number, end: number }
    | { kind: 'dictionary', entries: Map<string, PdfValue> }

/** The file is not one of ours, or was changed. */
export class NotOurs extends Error {}

const MAX_DEPTH = 60
const NUMBER = /-?\d+(?:\.\d+)?(?:e-\d+)?/y
const REFERENCE = /(\d+) 0 R/y
const WORD = /(?:true|false|null)\b/y
const NAME = /\/([^\s()<>[\]{}/%]+)/y
const HEX = /<[0-9a-f]*>/y
const SPACE = /[ \n]*/y

/** Walks over text in Latin-1, one character for one byte. */
export class PdfReader {
  constructor(readonly source: string, public at = 0) {}

  /** @throws NotOurs when the next bytes are others. */
  expect(bytes: string): void {
    if (!this.source.startsWith(bytes, this.at)) throw new NotOurs(`unexpected bytes at ${this.at}`)
    this.at += bytes.length
  }

  has(bytes: string): boolean {
    return this.source.startsWith(bytes, this.at)
  }

  match(pattern: RegExp): RegExpExecArray | null {
    pattern.lastIndex = this.at
    const found = pattern.exec(this.source)
    if (found) this.at += found[0].length
    return found
  }

  value(depth = 0): PdfValue {
    if (depth > MAX_DEPTH) throw new NotOurs('values nested too deeply')
    if (this.has('<<')) return this.dictionary(depth)
    const start = this.at
    if (this.match(HEX)) return { kind: 'hex', start, end: this.at }
    if (this.has('[')) return this.array(depth)
    if (this.has('(')) return this.text()
    const name = this.match(NAME)
    if (name) return { kind: 'name', value: name[1] ?? '' }
    const word = this.match(WORD)
    if (word) return { kind: 'word', value: word[0] as 'true' }
    const reference = this.match(REFERENCE)
    if (reference) return { kind: 'ref', id: Number(reference[1]) }
    const number = this.match(NUMBER)
    if (number) return { kind: 'number', value: Number(number[0]) }
    throw new NotOurs(`unexpected bytes at ${this.at}`)
  }

  private dictionary(depth: number): PdfValue {
    this.expect('<<')
    const entries = new Map<string, PdfValue>()
    this.match(SPACE)
    while (!this.has('>>')) {
      const key = this.match(NAME)?.[1]
      if (!key) throw new NotOurs(`a key is missing at ${this.at}`)
      if (entries.has(key)) throw new NotOurs(`the key ${key} stands twice`)
      this.expect(' ')
      entries.set(key, this.value(depth + 1))
      this.match(SPACE)
    }
    this.expect('>>')
    return { kind: 'dictionary', entries }
  }

  private array(depth: number): PdfValue {
    const start = this.at
    this.expect('[')
    const items: PdfValue[] = []
    this.match(SPACE)
    while (!this.has(']')) {
      items.push(this.value(depth + 1))
      this.match(SPACE)
    }
    this.expect(']')
    return { kind: 'array', items, start, end: this.at }
  }

  /** A string in parentheses; our writer escapes those inside, so none is open. */
  private text(): PdfValue {
    const start = this.at + 1
    for (let at = start; at < this.source.length; at++) {
      const sign = this.source[at]
      if (sign === '(') break
      if (sign === ')') {
        this.at = at + 1
        return { kind: 'text', value: this.source.slice(start, at) }
      }
      if (sign === '\\') at++
    }
    throw new NotOurs(`a string at ${start} does not end`)
  }
}
