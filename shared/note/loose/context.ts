/** What the words around a number speak of: which case, which wall, which result. */
import type { Fact, FactIndex } from '#shared/note/loose/facts'
import { contentWords } from '#shared/note/loose/facts'

export interface Context {
  /** Cases named just before and just after the number in its sentence. */
  cases: Set<string>
  walls: Set<string>
  /** The words of the sentence, in one spelling. */
  words: Set<string>
  /** Symbols and labels as they stand in the sentence. */
  tokens: Set<string>
}

const REACH = 240
const SENTENCE_END = /[.;!?](?=\s)|\n/g
const NAME = /[\p{L}][\p{L}\p{N}_′'’-]*/gu

/** The sentence around a range, at most `REACH` characters to either side. */
function sentence(text: string, from: number, to: number): { text: string, at: number } {
  const before = text.slice(Math.max(0, from - REACH), from)
  const after = text.slice(to, to + REACH)
  let start = 0
  for (const end of before.matchAll(SENTENCE_END)) start = end.index + 1
  const end = after.search(SENTENCE_END)
  const tail = end < 0 ? after : after.slice(0, end)
  const head = before.slice(start)
  return { text: `${head}${text.slice(from, to)}${tail}`, at: head.length }
}

function once<T>(make: () => T): () => T {
  let made: { value: T } | null = null
  return () => (made ??= { value: make() }).value
}

interface Mention { id: string, at: number }

function caseMentions(text: string, known: Set<string>): Mention[] {
  const found: Mention[] = []
  for (const match of text.matchAll(NAME)) {
    if (!known.has(match[0])) continue
    // A case called `T` or `A` is meant only where it is called a case.
    if (/\d/.test(match[0]) || /cases?\s+$/i.test(text.slice(Math.max(0, match.index - 8), match.index))) found.push({ id: match[0], at: match.index })
  }
  return found
}

function wallMentions(text: string, known: Set<string>): Mention[] {
  return [...text.matchAll(/\bwalls?\s+([\p{L}\p{N}′_-]{1,8})/giu)]
    .filter(match => match[1] !== undefined && known.has(match[1]))
    .map(match => ({ id: match[1] ?? '', at: match.index }))
}

/** The mention before the number and the one after it. Either may be meant, since people write both ways round. */
function nearest(mentions: Mention[], at: number): Set<string> {
  const before = mentions.filter(mention => mention.at < at).at(-1)
  const after = mentions.find(mention => mention.at >= at)
  return new Set([before, after].flatMap(mention => mention ? [mention.id] : []))
}

/**
 * Reads the surroundings of a number.
 * @param beyond Words that belong to it but stand elsewhere: the row and the heading of its cell in a table.
 */
export function contextOf(text: string, from: number, to: number, beyond: string, index: FactIndex): Context {
  const { text: around, at } = sentence(text, from, to)
  const whole = `${around} ${beyond}`
  const named = (mentions: (text: string) => Mention[]) => {
    const here = nearest(mentions(around), at)
    return here.size > 0 ? here : new Set(mentions(beyond).map(mention => mention.id))
  }
  // Read when asked for: most numbers are near no result, and nobody asks what their sentence speaks of.
  const cases = once(() => named(words => caseMentions(words, index.cases)))
  const walls = once(() => named(words => wallMentions(words, index.walls)))
  const words = once(() => new Set(contentWords(whole)))
  const tokens = once(() => new Set([...whole.matchAll(NAME)].map(match => match[0].replace(/['’]/g, '′'))))
  return {
    get cases() { return cases() },
    get walls() { return walls() },
    get words() { return words() },
    get tokens() { return tokens() },
  }
}

/** How closely the words around a number speak of a result: 0 not at all, 1 its case, wall or calculation, 2 its symbol or name. */
export function relation(fact: Fact, context: Context): 0 | 1 | 2 {
  if (fact.symbol !== '' && context.tokens.has(fact.symbol)) return 2
  const hits = fact.words.filter(word => context.words.has(word)).length
  if (fact.words.length > 0 && hits * 2 >= fact.words.length) return 2
  const named = (fact.caseId !== null && context.cases.has(fact.caseId)) || (fact.wall !== null && context.walls.has(fact.wall)) || context.tokens.has(fact.calcLabel)
  return named ? 1 : 0
}
