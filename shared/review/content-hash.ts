/**
 * The frozen parts of an issue as one canonical JSON text (RFC 8785). The
 * server takes SHA-256 over its UTF-8 bytes; nobody else makes the hash.
 */
import type { Evaluation } from '#shared/calc/types'
import { canonicalJson } from '#shared/note/canonical'

export interface FrozenAnswer {
  calcId: string
  guardKey: string
  kind: 'answer' | 'deviation'
  text: string
  /** The values it was given at, as stored. */
  facts: unknown
  authorId: string
  /** ISO 8601, UTC. */
  at: string
}
export interface FrozenDecision { blockId: string, text: string, ordinal: number, verdict: string, reason: string, authorId: string, at: string }

export interface FrozenParts {
  number: string
  letter: string
  title: string
  part: string
  drawingIssue: string
  changeNote: string
  /** The document as JSON. */
  document: unknown
  results: Record<string, Evaluation>
  answers: readonly FrozenAnswer[]
  loose: readonly FrozenDecision[]
  engineVersion: string
}

/** Raised when the shape of the hashed text changes, so that an old hash is never compared with a new shape. */
export const CONTENT_SHAPE = 1

const byText = (a: string, b: string) => a < b ? -1 : a > b ? 1 : 0

/** The text that is hashed. The order in which answers and decisions were read does not matter. @throws TypeError for what is not JSON */
export function contentText(parts: FrozenParts): string {
  const { number, letter, title, part, drawingIssue, changeNote, document, results, engineVersion } = parts
  const answers = parts.answers.map(({ calcId, guardKey, kind, text, facts, authorId, at }) => ({ calcId, guardKey, kind, text, facts, authorId, at }))
  const loose = parts.loose.map(({ blockId, text, ordinal, verdict, reason, authorId, at }) => ({ blockId, text, ordinal, verdict, reason, authorId, at }))
  answers.sort((a, b) => byText(`${a.calcId} ${a.guardKey}`, `${b.calcId} ${b.guardKey}`))
  loose.sort((a, b) => byText(a.blockId, b.blockId) || byText(a.text, b.text) || a.ordinal - b.ordinal)
  return canonicalJson({ shape: CONTENT_SHAPE, number, letter, title, part, drawingIssue, changeNote, document, results, answers, loose, engineVersion })
}
