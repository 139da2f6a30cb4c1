import type { FactIndex } from '#shared/note/loose/facts'
import type { Judgement } from '#shared/note/loose/judge'
import type { Quantity } from '#shared/note/loose/quantities'
import type { ScannedText } from '#shared/note/loose/texts'

export interface Judged { quantity: Quantity, judgement: Judgement }

const keyOf = ({ text, beyond, headings }: ScannedText) => [text, beyond, ...headings].join('\u0000')

/**
 * What the scan before found, kept by its caller between scans of one note: a text
 * that did not change, compared with results that did not change, is not read again.
 * It never changes what is found.
 */
export class ScanMemory {
  private compared: { results: unknown, labels: string, index: FactIndex } | null = null
  private before = new Map<string, Judged[]>()
  private now = new Map<string, Judged[]>()

  /** Begins a scan. The index of another set of results forgets all that was found. */
  begin(results: unknown, labels: string, make: () => FactIndex): FactIndex {
    const held = this.compared
    const same = held !== null && held.results === results && held.labels === labels
    const compared = same ? held : { results, labels, index: make() }
    this.compared = compared
    // Texts of the scan before last are gone from the note.
    this.before = same ? this.now : new Map()
    this.now = new Map()
    return compared.index
  }

  recall(scanned: ScannedText, read: () => Judged[]): Judged[] {
    const key = keyOf(scanned)
    const found = this.now.get(key) ?? this.before.get(key) ?? read()
    this.now.set(key, found)
    return found
  }
}
