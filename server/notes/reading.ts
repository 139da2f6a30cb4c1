import type { Node } from '@tiptap/pm/model'
import { ScanMemory } from '#shared/note/loose/memory'
import { scanLooseNumbers, type LooseNumber } from '#shared/note/loose-numbers'
import { readDocument } from '#shared/note/schema'
import type { Issue } from '#server/database/entities/issue'
import type { Results } from './evaluate-document'

type Stored = Pick<Issue, 'id' | 'document' | 'results' | 'title'>

/** All frozen parts of an issue as canonical text, and its SHA-256. */
export interface Content { text: string, hash: string }

/** What is read out of the stored texts of an issue, each at most once. Nobody may change what they get. */
interface Reading { document: string, results: string, title: string, doc?: Node, parsed?: Results, loose?: LooseNumber[], content?: { rest: string, made: Content }, scanned: ScanMemory }

/**
 * The readings of the issues asked for last. A cache and no truth: it is compared
 * with the stored texts themselves each time, so another instance's save shows.
 */
const readings = new Map<string, Reading>()
const mostCharacters = 12_000_000

function forgetOldest(): void {
  let characters = 0
  for (const { document, results } of readings.values()) characters += document.length + results.length
  for (const [id, { document, results }] of readings) {
    if (characters <= mostCharacters || readings.size === 1) return
    readings.delete(id)
    characters -= document.length + results.length
  }
}

function readingOf({ id, document, results, title }: Stored): Reading {
  const held = readings.get(id)
  readings.delete(id)
  const fresh = (): Reading => {
    const sameResults = held?.results === results
    return { document, results, title, scanned: sameResults ? held.scanned : new ScanMemory(), ...(sameResults && held.parsed ? { parsed: held.parsed } : {}) }
  }
  const reading = held && held.document === document && held.results === results && held.title === title ? held : fresh()
  // Put last, so that the first is the one not asked for longest.
  readings.set(id, reading)
  forgetOldest()
  return reading
}

/** The document of the issue as saved. */
export function documentOf(issue: Stored): Node {
  const reading = readingOf(issue)
  return reading.doc ??= readDocument(JSON.parse(reading.document))
}

/** The results of the issue as saved. */
export function resultsOf(issue: Stored): Results {
  const reading = readingOf(issue)
  return reading.parsed ??= JSON.parse(reading.results) as Results
}

/** The typed quantities of the saved note that are tied to nothing. The same module marks them in the editor; this is the authority. */
export function looseNumbersOf(issue: Stored): LooseNumber[] {
  const reading = readingOf(issue)
  return reading.loose ??= scanLooseNumbers(documentOf(issue), resultsOf(issue), { noteTitle: issue.title }, reading.scanned)
}

/** The content made of these texts and of `rest`, which says in one string what else goes into it. */
export function contentRead(issue: Stored, rest: string, make: () => Content): Content {
  const reading = readingOf(issue)
  const held = reading.content
  if (held?.rest === rest) return held.made
  const made = make()
  reading.content = { rest, made }
  return made
}
